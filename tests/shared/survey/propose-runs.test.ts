import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { type ProposalRules, proposeRuns } from '@shared/survey/propose-runs'
import { inches } from '@shared/units/length'
import { aBay, aPost, aRow, aRun, surveyOf } from '../../factories/survey'
import { anySurvey } from '../../support/survey-arbitrary'

const plain: ProposalRules = { cable: 'c532', maxBend: 0 }

function proposed(survey: Survey, rules: ProposalRules): Survey {
  const operations = proposeRuns(survey, rules)
  return operations.length > 0 ? applyOperation(survey, { type: 'group', operations }) : survey
}

/** The bays of each run after the proposal: `R1: B1 B2`. */
const runsOf = (survey: Survey, rules: Partial<ProposalRules> = {}) =>
  proposed(survey, { ...plain, ...rules }).runs.map(({ id, bays }) => `${id}: ${bays.join(' ')}`)

const posts = (count: number) => Array.from({ length: count }, (_, i) => aPost(`P${i + 1}`))

describe('where a run goes', () => {
  it('goes straight on through a row, in whichever direction its bays were written', () => {
    const bays = [aBay('B1', ['P1', 'P2']), aBay('B2', ['P3', 'P2']), aBay('B3', ['P3', 'P4'])]
    expect(runsOf(surveyOf({ posts: posts(4), bays }))).toEqual(['R1: B1 B2 B3'])
    const shuffled = [bays[1]!, bays[2]!, bays[0]!]
    expect(runsOf(surveyOf({ posts: posts(4), bays: shuffled }))).toEqual(['R1: B3 B2 B1'])
  })

  it.each([
    [90, ['R1: B1', 'R2: B2 B3']],
    [170, ['R1: B1', 'R2: B2 B3']],
    [178, ['R1: B1 B2 B3']],
    [180, ['R1: B1 B2 B3']],
  ])('with a corner of %d degrees at the second post', (angle, runs) => {
    expect(runsOf(aRow([48, 48, 48], { corners: [{ post: 'P2', angle }] }))).toEqual(runs)
  })

  it('ends where more than two bays meet', () => {
    const bays = [aBay('B1', ['P1', 'P2']), aBay('B2', ['P2', 'P3']), aBay('B3', ['P2', 'P4'])]
    expect(runsOf(surveyOf({ posts: posts(4), bays }))).toEqual(['R1: B1', 'R2: B2', 'R3: B3'])
  })

  it('treats bays that come back to where they began as turning at every post', () => {
    const bays = [
      aBay('B1', ['P1', 'P2']),
      aBay('B2', ['P2', 'P3']),
      aBay('B3', ['P3', 'P4']),
      aBay('B4', ['P4', 'P1']),
    ]
    expect(runsOf(surveyOf({ posts: posts(4), bays }))).toEqual(['R1: B1', 'R2: B2', 'R3: B3', 'R4: B4'])
    const corners = [{ post: 'P3', angle: 180 }]
    expect(runsOf(surveyOf({ posts: posts(4), bays, corners }))).toEqual(['R1: B1', 'R2: B2 B3', 'R3: B4'])
  })

  it('ends between level and stair, and where the pitch changes by more than the house lets a cable bend', () => {
    const stair = (id: string, ends: [string, string], gauge: number) =>
      aBay(id, ends, { kind: 'stair', gauge })
    const bays = [
      aBay('B1', ['P1', 'P2']),
      stair('B2', ['P2', 'P3'], 35),
      stair('B3', ['P3', 'P4'], 36.5),
      stair('B4', ['P4', 'P5'], 36.5),
    ]
    const survey = surveyOf({ posts: posts(5), bays })
    expect(runsOf(survey)).toEqual(['R1: B1', 'R2: B2', 'R3: B3 B4'])
    expect(runsOf(survey, { maxBend: 2 })).toEqual(['R1: B1', 'R2: B2 B3 B4'])
  })

  it('takes the pitch from rise and going before the gauge', () => {
    // Rise 3, going 4: 36.87 degrees
    const bays = [
      aBay('B1', ['P1', 'P2'], { kind: 'stair', rise: inches(3), going: inches(4), gauge: 30 }),
      aBay('B2', ['P2', 'P3'], { kind: 'stair', gauge: 30 }),
    ]
    expect(runsOf(surveyOf({ posts: posts(3), bays }), { maxBend: 6 })).toEqual(['R1: B1', 'R2: B2'])
    expect(runsOf(surveyOf({ posts: posts(3), bays }), { maxBend: 7 })).toEqual(['R1: B1 B2'])
  })
})

describe('a row longer than a run may be', () => {
  it('is divided evenly', () => {
    // Four bays of 120 in and three posts of 3 1/2 in are 490 1/2 in; halves of 243 1/2.
    const survey = aRow([120, 120, 120, 120])
    expect(runsOf(survey, { longestRun: inches(490.5) })).toEqual(['R1: B1 B2 B3 B4'])
    expect(runsOf(survey, { longestRun: inches(490) })).toEqual(['R1: B1 B2', 'R2: B3 B4'])
    expect(runsOf(survey, { longestRun: inches(243.5) })).toEqual(['R1: B1 B2', 'R2: B3 B4'])
    expect(runsOf(survey, { longestRun: inches(243) })).toEqual(['R1: B1', 'R2: B2', 'R3: B3', 'R4: B4'])
  })

  it('leaves a bay that is too long by itself whole', () => {
    expect(runsOf(aRow([300, 40]), { longestRun: inches(240) })).toEqual(['R1: B1', 'R2: B2'])
  })

  it('is measured along the slope', () => {
    // 40 in taped level at rise 3, going 4 are 50 in along the cable: two and a post are 103 1/2.
    const stair = { kind: 'stair', taped: 'level', rise: inches(3), going: inches(4), read: 40 } as const
    const bays = [aBay('B1', ['P1', 'P2'], stair), aBay('B2', ['P2', 'P3'], stair)]
    const survey = surveyOf({ posts: posts(3), bays })
    expect(runsOf(survey, { longestRun: inches(103.5) })).toEqual(['R1: B1 B2'])
    expect(runsOf(survey, { longestRun: inches(103) })).toEqual(['R1: B1', 'R2: B2'])
  })
})

describe('runs there are', () => {
  const settings = {
    cable: 'c18',
    tension: 700,
    cables: { heights: [inches(4), inches(8)] },
  }

  it('stay as they are where they hold, even if they could be longer', () => {
    const survey = aRow([48, 48], { runs: [aRun('R1', ['B1'], settings), aRun('R2', ['B2'])] })
    expect(proposeRuns(survey, plain)).toEqual([])
  })

  it('take in a bay that goes on from them, with cable and settings kept', () => {
    const survey = aRow([48, 48, 48], { runs: [aRun('R7', ['B2'], settings)] })
    const changed = proposed(survey, plain)
    expect(changed.runs).toEqual([{ ...survey.runs[0], bays: ['B1', 'B2', 'B3'] }])
  })

  it('do not where they were read overall, or would be too long: the bay gets a run like the first', () => {
    const readings = [{ id: 'r1', value: inches(48) }]
    const read = aRow([48, 48], { runs: [aRun('R1', ['B1'], { ...settings, readings })] })
    const changed = proposed(read, plain)
    expect(changed.runs).toEqual([read.runs[0], { ...read.runs[0], id: 'R2', bays: ['B2'], readings: [] }])
    const long = aRow([48, 48], { runs: [aRun('R1', ['B1'])] })
    expect(runsOf(long, { longestRun: inches(99) })).toEqual(['R1: B1', 'R2: B2'])
    expect(runsOf(long, { longestRun: inches(99.5) })).toEqual(['R1: B1 B2'])
  })

  it('are divided at a corner found later; each part keeps the settings and the overall reading is struck', () => {
    const readings = [{ id: 'r1', value: inches(151) }]
    const survey = aRow([48, 48, 48], {
      runs: [aRun('R1', ['B1', 'B2', 'B3'], { ...settings, readings }), aRun('R5', ['B3'])],
      corners: [{ post: 'P2', angle: 90 }],
    })
    const changed = proposed(survey, plain)
    expect(changed.runs.map(({ id, bays }) => [id, ...bays])).toEqual([
      ['R1', 'B1'],
      ['R6', 'B2', 'B3'],
      ['R5', 'B3'],
    ])
    expect(changed.runs[0]?.readings).toEqual([
      { ...survey.runs[0]?.readings[0], struck: 'the run ends elsewhere now' },
    ])
    expect(changed.runs[1]).toMatchObject({ ...settings, readings: [] })
  })

  it('are divided where their overall reading is too long, by what it leaves for bays not read', () => {
    const bays = ['P2', 'P3', 'P4', 'P5'].map((to, i) => aBay(`B${i + 1}`, [`P${i + 1}`, to], { read: null }))
    const runs = [aRun('R1', ['B1', 'B2', 'B3', 'B4'], { readings: [{ id: 'r1', value: inches(490.5) }] })]
    const survey = surveyOf({ posts: posts(5), bays, runs })
    expect(runsOf(survey, { longestRun: inches(490) })).toEqual(['R1: B1 B2', 'R2: B3 B4'])
    expect(runsOf(survey, { longestRun: inches(491) })).toEqual(['R1: B1 B2 B3 B4'])
  })
})

describe('whatever the survey', { timeout: 60_000 }, () => {
  const rules = fc.record({
    cable: fc.constant('c532'),
    maxBend: fc.constantFrom(0, 5),
    longestRun: fc.option(fc.integer({ min: 1, max: 8_000_000_000 }), { nil: undefined }),
  })

  it('every bay has a run, the survey stays valid, nothing more is proposed, and only runs change', () => {
    fc.assert(
      fc.property(anySurvey, rules, (survey, given) => {
        const changed = proposed(survey, given)
        expect(surveySchema.safeParse(changed).success).toBe(true)
        const covered = new Set(changed.runs.flatMap(({ bays }) => bays))
        expect(changed.bays.filter(({ id }) => !covered.has(id))).toEqual([])
        expect(proposeRuns(changed, given)).toEqual([])
        expect({ ...changed, runs: [] }).toEqual({ ...survey, runs: [] })
        for (const run of survey.runs) {
          const { cable, cables, tension, readings } = changed.runs.find(({ id }) => id === run.id)!
          expect({ cable, cables, tension }).toEqual({
            cable: run.cable,
            cables: run.cables,
            tension: run.tension,
          })
          expect(readings.map(({ id, value }) => [id, value])).toEqual(
            run.readings.map(({ id, value }) => [id, value]),
          )
        }
      }),
      { numRuns: 300 },
    )
  })
})
