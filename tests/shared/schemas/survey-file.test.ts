import { isDeepStrictEqual } from 'node:util'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { quantitiesIn } from '@shared/schemas/quantities'
import { readSurveyFile, SurveyFileError, writeSurveyFile } from '@shared/schemas/survey-file'
import { surveySchema } from '@shared/schemas/survey'
import { anySurvey } from '../../support/survey-arbitrary'
import { type Json, sample, sampleWith } from './support/sample'

function faultsOf(input: unknown): string[] {
  try {
    readSurveyFile(input)
  } catch (error) {
    if (error instanceof SurveyFileError) return error.faults
    throw error
  }
  throw new Error('the file was read')
}

describe('the sample', () => {
  it('is read into whole nanometres, newtons and minor units of money', () => {
    const { survey, hardware, rules } = readSurveyFile(sample)
    // 46 1/2 in × 25 400 000; 150 lbf × 4.4482216152605 (NIST SP 811)
    expect(survey.bays[0]?.readings[0]?.value).toBe(1_181_100_000)
    expect(survey.runs[0]?.tension).toBeCloseTo(667.233242289075, 9)
    expect(hardware?.fittings[0]?.price).toBe(1234)
    expect(rules?.cutStep).toBe(1_587_500)
    expect(surveySchema.parse(survey)).toEqual(survey)
  })

  it('is written as it was read', () => {
    expect(writeSurveyFile(readSurveyFile(sample))).toEqual(sample)
  })

  it('reads the same figures as millimetres where it says so', () => {
    const metric = { ...sample, survey: { ...sample.survey, units: { length: 'mm', force: 'N' } } }
    const file = readSurveyFile(metric)
    expect(file.survey.bays[0]?.readings[0]?.value).toBe(46_500_000)
    expect(file.survey.runs[0]?.tension).toBe(150)
    expect(writeSurveyFile(file)).toEqual(metric)
  })

  it('may leave out hardware and rules, and what has a starting value', () => {
    const { survey, ...rest } = readSurveyFile({
      survey: { format: 'tautbook.survey', version: 1, units: { length: 'in', force: 'lbf' }, title: 'Bare' },
    })
    expect(rest).toEqual({})
    expect(survey).toMatchObject({ posts: [], bays: [], guard: { height: 36 * 25_400_000 } })
  })
})

describe('any survey', { timeout: 60_000 }, () => {
  it('is the same after writing and reading, forces in pounds-force to 14 digits', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const { survey: back } = readSurveyFile(JSON.parse(JSON.stringify(writeSurveyFile({ survey }))))
        const runs = back.runs.map((run, i) => {
          const before = survey.runs[i]?.tension
          if (run.tension === undefined || before === undefined) return run
          expect(Math.abs(run.tension / before - 1)).toBeLessThan(1e-14)
          return { ...run, tension: before }
        })
        const same = { ...back, runs }
        if (!isDeepStrictEqual(same, survey))
          expect.fail(`${JSON.stringify(same)} is not ${JSON.stringify(survey)}`)
      }),
      { numRuns: 200 },
    )
  })

  it('every whole force up to 3000 lbf is written as it was read', () => {
    const { force } = quantitiesIn({ length: 'in', force: 'lbf' })
    for (let pounds = 1; pounds <= 3000; pounds += 1) {
      expect(z.encode(force, z.decode(force, pounds))).toBe(pounds)
    }
  })
})

describe('unknown keys', () => {
  it.each([
    [['colour'], 'colour'],
    [['survey', 'colour'], 'survey.colour'],
    [['survey', 'units', 'angle'], 'survey.units.angle'],
    [['survey', 'guard', 'readAt', 'middle'], 'survey.guard.readAt.middle'],
    [['survey', 'posts', 0, 'colour'], 'survey.posts[0].colour'],
    [['survey', 'bays', 1, 'height'], 'survey.bays[1].height'],
    [['survey', 'bays', 0, 'readings', 1, 'unit'], 'survey.bays[0].readings[1].unit'],
    [['survey', 'photos', 0, 'posts', 'P1', 'middle'], 'survey.photos[0].posts.P1.middle'],
    [['hardware', 'fittings', 0, 'maker'], 'hardware.fittings[0].maker'],
    [['rules', 'kerf'], 'rules.kerf'],
  ] as const)('%j is refused with its path', (path, shown) => {
    expect(faultsOf(sampleWith(path, 1))).toEqual([`${shown}: unknown key; remove it or correct its name`])
  })

  it('are named all at once', () => {
    const twice = sampleWith(['survey', 'colour'], 1) as { rules: object }
    expect(faultsOf({ ...twice, rules: { ...twice.rules, kerf: 1, saw: 2 } })).toHaveLength(3)
    expect(faultsOf({ ...twice, rules: { ...twice.rules, kerf: 1, saw: 2 } }).join('\n')).toMatch(
      /survey\.colour[^]*rules\.kerf[^]*rules\.saw/,
    )
  })
})

describe('every fault names path, value and what was expected', () => {
  it.each<[(string | number)[], Json | undefined, string]>([
    [['survey', 'title'], 7, 'survey.title: found 7, expected text'],
    [['survey', 'title'], undefined, 'survey.title: found nothing, expected text'],
    [['survey', 'version'], 2, 'survey.version: found 2, expected 1'],
    [['survey', 'format'], 'other', 'survey.format: found "other", expected "tautbook.survey"'],
    [['survey', 'units', 'length'], 'cm', 'survey.units.length: found "cm", expected one of "in", "mm"'],
    [['survey', 'posts'], 'P1', 'survey.posts: found "P1", expected a list in [ ]'],
    [['survey', 'posts', 0, 'cover'], -1, 'survey.posts[0].cover: found -1, expected a number at least 0'],
    [['survey', 'posts', 0, 'along'], 0, 'survey.posts[0].along: found 0, expected a number above 0'],
    [
      ['survey', 'posts', 0, 'along'],
      1e-9,
      'survey.posts[0].along: found 1e-9, expected a length above zero',
    ],
    [['survey', 'posts', 0, 'along'], '3.5', 'survey.posts[0].along: found "3.5", expected a number'],
    [
      ['survey', 'posts', 0, 'material'],
      'pine',
      'survey.posts[0].material: found "pine", expected one of "softwood", "hardwood", "veneered", "masonry", "metal"',
    ],
    [
      ['survey', 'posts', 0, 'id'],
      'P 1',
      'survey.posts[0].id: found "P 1", expected 1 to 40 letters, digits, dots, dashes or underscores, beginning with a letter or digit',
    ],
    [
      ['survey', 'posts', 1, 'id'],
      'P1',
      'survey.posts[1].id: found "P1", expected an id that is not used twice',
    ],
    [
      ['survey', 'bays', 0, 'to'],
      'P9',
      'survey.bays[0].to: found "P9", expected the id of a post of this survey',
    ],
    [
      ['survey', 'bays', 0, 'to'],
      'P1',
      'survey.bays[0].to: found "P1", expected another post than the bay begins at',
    ],
    [
      ['survey', 'bays', 0, 'readings', 0, 'on'],
      'May',
      'survey.bays[0].readings[0].on: found "May", expected a date and time such as 2026-05-04T10:12:00Z',
    ],
    [['survey', 'runs', 0, 'bays'], [], 'survey.runs[0].bays: found [], expected a list of at least 1 entry'],
    [
      ['survey', 'runs', 0, 'bays', 0],
      'B9',
      'survey.runs[0].bays[0]: found "B9", expected the id of a bay of this survey',
    ],
    [
      ['survey', 'runs', 0, 'cable'],
      'rope',
      'survey.runs[0].cable: found "rope", expected the id of a cable of the hardware',
    ],
    [
      ['survey', 'corners', 0, 'angle'],
      200,
      'survey.corners[0].angle: found 200, expected a number at most 180',
    ],
    [
      ['survey', 'photos', 0, 'posts', 'P9'],
      { base: [0, 0] },
      'survey.photos[0].posts.P9: found {"base":[0,0]}, expected the id of a post of this survey',
    ],
    [['rules', 'reserve'], 2, 'rules.reserve: found 2, expected a number at most 0.9'],
    [
      ['hardware', 'fittings', 0, 'takeUp'],
      undefined,
      'hardware.fittings[0].takeUp: found nothing, expected a number',
    ],
  ])('%j = %j', (path, value, fault) => {
    expect(faultsOf(sampleWith(path, value))).toContain(fault)
  })

  it.each([[null], [[]], ['survey'], [{}], [{ survey: null }]])('of %j too', (input) => {
    expect(faultsOf(input).join('\n')).toMatch(/: found .*, expected/)
  })

  it('a run that turns back, and a corner given twice', () => {
    const sideBySide = sampleWith(['survey', 'bays', 1, 'to'], 'P1') as typeof sample
    sideBySide.survey.runs = [{ ...sideBySide.survey.runs[0]!, bays: ['B1', 'B2'] }]
    expect(faultsOf(sideBySide)).toEqual([
      'survey.runs[0].bays[1]: found "B2", expected a bay that leads on, not back to the post before',
    ])
    const twice = structuredClone(sample)
    twice.survey.corners.push({ post: 'P3', angle: 180 })
    expect(faultsOf(twice)).toEqual([
      'survey.corners[1].post: found "P3", expected a post whose angle is not given above',
    ])
  })
})
