import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { surveyOperationSchema } from '@shared/survey/survey-operation'
import { toInches } from '@shared/units/length'
import type { DemoPicture } from '../../../../server/database/seed/demo-company'
import { demoVisit, type DemoVisit } from '../../../../server/database/seed/demo-survey'
import { type DemoTruth, readDemoTruth } from '../../../../server/database/seed/demo-truth'

const demoFolder = new URL('../../../../demo', import.meta.url).pathname

async function visit(picture: DemoPicture, stoppedAt?: DemoVisit['stoppedAt']) {
  const truth = await readDemoTruth(demoFolder, picture)
  const blank = surveySchema.parse({
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'in', force: 'lbf' },
    title: picture,
  })
  const survey = demoVisit({ truth, photo: { id: 'F1', file: `${picture}.jpg` }, cable: 'c532', stoppedAt })
    .map((operation) => surveyOperationSchema.parse(operation))
    .reduce(applyOperation, blank)
  return {
    truth,
    survey,
    result: calculateSurvey({ survey, hardware: starterHardware, rules: starterRules }),
  }
}

/** Taped length of a run at mid-height by the truth's own figures: bays and the posts passed, inches. */
function truthLength(truth: DemoTruth, posts: string[]): number {
  const bays = truth.taped.bays.filter(({ from, to }) => posts.includes(from) && posts.includes(to))
  const passed = posts.slice(1, -1).map((id) => truth.posts.find((post) => post.id === id)?.sizeAlong ?? 0)
  return (
    bays.reduce((sum, { bottom, top }) => sum + (bottom.in + top.in) / 2, 0) +
    passed.reduce((a, b) => a + b, 0)
  )
}

const marks = (survey: Survey) => survey.photos[0]?.posts ?? {}

describe('the harbour deck', () => {
  it('has every post marked and a cable list that the shop can cut', async () => {
    const { truth, survey, result } = await visit('harbour-deck')
    expect(Object.keys(marks(survey))).toHaveLength(9)
    expect(survey.corners).toEqual([
      { post: 'P2', angle: 90 },
      { post: 'P6', angle: 90.5 },
    ])
    expect(result.runs.map(({ cables }) => cables.length)).toEqual([11, 11, 11])
    expect(result.cables.every(({ mode }) => mode === 'shop')).toBe(true)
    expect(result.findings.filter(({ level }) => level === 'stop')).toEqual([])
    // Two fittings with a cut point 3/4 in past the face, and less than 1/2 in of slack, added to what was taped.
    result.runs.forEach(({ cables }, i) => {
      const more = toInches(cables[5]?.cut ?? 0) - truthLength(truth, truth.runs[i]?.posts ?? [])
      expect(more).toBeGreaterThan(1.4)
      expect(more).toBeLessThan(2.1)
    })
  })

  it('writes diagonals centre to centre, within an eighth of the truth', async () => {
    const { survey } = await visit('harbour-deck')
    const values = survey.diagonals.map(({ value }) => toInches(value))
    // Truth: 220.37131 and 271.68873 in, centre to centre.
    expect(values).toHaveLength(2)
    expect(Math.abs((values[0] ?? 0) - 220.37131)).toBeLessThan(0.125)
    expect(Math.abs((values[1] ?? 0) - 271.68873)).toBeLessThan(0.125)
  })
})

describe('the mill stair', () => {
  it('has a level run and a stair run, both with lengths', async () => {
    const { survey, result } = await visit('mill-stair')
    expect(survey.bays.map(({ kind }) => kind)).toEqual(['level', 'level', 'stair', 'stair'])
    expect(result.findings.filter(({ level }) => level === 'stop')).toEqual([])
    expect(result.cables.every(({ mode }) => mode !== 'none')).toBe(true)
    // Truth: slope lengths 44.05 and 44.35 in, one post of 3.5 in passed at 34.6242 degrees: 92.66 in, and two cut points.
    const stair = result.runs[1]?.cables[3]
    expect(toInches(stair?.path ?? 0)).toBeGreaterThan(92.3)
    expect(toInches(stair?.path ?? 0)).toBeLessThan(93)
  })
})

describe('the ridge deck', () => {
  it('was left unfinished: bays unread and a material missing', async () => {
    const { survey, result } = await visit('ridge-deck', { bay: 5, post: 'E2' })
    expect(survey.bays.filter(({ readings }) => readings.length === 0).map(({ id }) => id)).toEqual([
      'B6',
      'B7',
      'B8',
    ])
    expect(survey.posts.filter(({ material }) => !material).map(({ id }) => id)).toEqual(['E2'])
    expect(result.cables.every(({ mode }) => mode === 'none')).toBe(true)
    expect(result.findings.some(({ code }) => code === 'post-out-of-plumb')).toBe(true)
  })
})

describe('the rectangle on each picture', () => {
  it.each(['harbour-deck', 'mill-stair', 'ridge-deck'] as const)(
    '%s: clockwise from the near left corner',
    async (picture) => {
      const { survey } = await visit(picture)
      const corners = survey.photos[0]?.rectangle?.corners
      if (!corners) throw new Error('no rectangle')
      const [nearLeft, farLeft, farRight, nearRight] = corners
      // Twice the signed area, y downward: positive when clockwise as seen.
      const area = corners.reduce((sum, [x, y], i) => {
        const [nextX, nextY] = corners[(i + 1) % 4]!
        return sum + x * nextY - nextX * y
      }, 0)
      expect(area).toBeGreaterThan(0)
      expect(nearLeft[0]).toBeLessThan(nearRight[0])
      expect(farLeft[1]).toBeLessThan(nearRight[1])
      expect(nearLeft[1] + nearRight[1]).toBeGreaterThan(farLeft[1] + farRight[1])
    },
  )
})
