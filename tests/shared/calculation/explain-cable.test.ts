import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { explainCable } from '@shared/calculation/explain-cable'
import { type Phrase, writePhrase } from '@shared/calculation/phrase'
import type { CalculationInput } from '@shared/calculation/survey-index'
import type { CableWorking, WorkingLine } from '@shared/calculation/working'
import { toInches } from '@shared/units/length'
import { bay, exampleFitting, type Given, inputOf, noLimits, oneBay, post } from './support/inputs'

const explain = (given: Given | CalculationInput, cable = 1): CableWorking => {
  const input = 'survey' in given ? given : inputOf(given)
  const working = explainCable(input, { run: 'R1', cable })
  if (!working) throw new Error('expected a working')
  return working
}
const text = (phrase: Phrase | undefined) => writePhrase(phrase ?? [], { length: 'in', force: 'lbf' })
const line = ({ label, value, reason }: WorkingLine) =>
  `${text(label)}: ${Number(toInches(value).toFixed(6))}; ${text(reason)}`

/** The worked example: two bays of which the first was read at top and bottom. */
const example: Given = {
  posts: [post('P1'), post('P2'), post('P3', { material: 'hardwood' })],
  bays: [bay('B1', ['P1', 'P2'], [46.5, 46.25]), bay('B2', ['P2', 'P3'], [44.125])],
  run: { cables: { layout: 'even', spacing: 3 } },
  rules: { tapeClass: 'II' },
}

describe('the working of a shop cable', () => {
  const working = explain(example, 10)

  it('gives the same result as the survey', () => {
    expect(working.result).toEqual(calculateSurvey(inputOf(example)).cables[9])
  })

  it('goes bay by bay and post by post', () => {
    expect(working.path.map(line)).toEqual([
      'Bay B1: 46.464583; 46 1/2 in at the top and 46 1/4 in at the bottom give 46.4646 in at the cable’s height of 28 3/4 in',
      'Post P2: 3.5; passed square: its size along, 3 1/2 in',
      'Bay B2: 44.125; 44 1/8 in at the top, at every height',
    ])
    expect(working.pathTotal && line(working.pathTotal)).toBe('Path: 94.089583; from end face to end face')
  })

  it('says how high and why', () => {
    expect(line(working.height)).toBe(
      'Height of the hole’s centre: 28.75; cable 10 of 11 between 0 in and 34 1/2 in, in 12 equal openings of no more than 3 in, rounded to 1/16 in',
    )
  })

  it('says how deep each end sits', () => {
    expect(working.ends.map(({ depth }) => depth && line(depth))).toEqual([
      'Depth at P1: 0.75; the cable ends 1 in past the fitting’s face, which stands 1/4 in proud of the post',
      'Depth at P3: 0.75; the cable ends 1 in past the fitting’s face, which stands 1/4 in proud of the post',
    ])
  })

  it('stacks limits that come to U', () => {
    expect(working.limits.map(({ kind, value }) => [kind, Number(toInches(value).toFixed(6))])).toEqual([
      ['reading', 0.0625],
      ['reading', 0.0625],
      ['reading', 0.0625],
      ['tape', 0.055118],
      ['cut', 0.0625],
      ['seat', 0.03125],
      ['seat', 0.03125],
    ])
    const squares = working.limits.reduce((sum, { value }) => sum + value ** 2, 0)
    expect(working.slop?.value).toBeCloseTo(Math.sqrt(squares), 3)
    const onSite = working.limits
      .filter(({ onSite }) => onSite)
      .reduce((sum, { value }) => sum + value ** 2, 0)
    expect(working.siteSlop?.value).toBeCloseTo(Math.sqrt(onSite), 3)
  })

  it('adds up: path and depths, base and slack, slack and stretch and U', () => {
    const value = (label: string) =>
      working.outcome.find((found) => text(found.label) === label)?.value ?? NaN
    const sum = (lines: WorkingLine[]) => lines.reduce((total, { value: part }) => total + part, 0)
    expect(sum(working.path)).toBeCloseTo(working.pathTotal?.value ?? NaN, 3)
    const depths = working.ends.reduce((total, { depth }) => total + (depth?.value ?? NaN), 0)
    expect((working.pathTotal?.value ?? NaN) + depths).toBeCloseTo(working.base?.value ?? NaN, 3)
    expect((working.base?.value ?? NaN) + value('Slack')).toBeCloseTo(value('Cut length'), 3)
    expect(value('Slack') + (working.stretch?.value ?? NaN)).toBeCloseTo(value('Planned take-up'), 3)
    expect(value('Planned take-up') + (working.slop?.value ?? NaN)).toBeCloseTo(value('Worst take-up'), 3)
    expect(value('Worst take-up') + value('Left of the limit')).toBeCloseTo(working.limit?.value ?? NaN, 3)
    expect(text(working.mode)).toBe(
      'Both ends in the shop: slack, U and stretch come to 0.5151 in, within the limit of 1.275 in',
    )
    expect(text(working.stretch?.reason)).toBe('of the path at 150 lbf: elastic 0.099 % and settling 0.125 %')
  })
})

describe('the fittings passed over', () => {
  it('are kept with their reasons', () => {
    const fittings = [
      { ...exampleFitting, id: 'long', name: 'Long', body: 2 },
      { ...exampleFitting, id: 'deep', name: 'Deep', body: 3.25 },
      { ...exampleFitting, id: 'wall', name: 'Wall', materials: ['masonry'] },
      exampleFitting,
    ]
    const [from] = explain(oneBay({ fittings })).ends
    expect(from).toMatchObject({ end: 'from', post: 'P1', fitting: 'F1', name: 'Example sleeve' })
    expect(from?.passedOver.map(({ fitting, reason }) => `${fitting} ${text(reason)}`)).toEqual([
      'deep its body of 3 1/4 in is longer than the 3 in the post allows',
      'wall not made for softwood posts',
      'long suits, but its body of 2 in is longer than 1 1/2 in',
    ])
  })
})

describe('the working of other cables', () => {
  it('tells a stair’s slope', () => {
    const stair = { kind: 'stair', rise: 30, going: 40, taped: 'level' }
    const given = {
      posts: [post('P1'), post('P2'), post('P3')],
      bays: [
        bay('B1', ['P1', 'P2'], [60], stair),
        bay('B2', ['P2', 'P3'], [75], { ...stair, taped: 'slope' }),
      ],
      fittings: [{ ...exampleFitting, maxAngle: 40 }],
    }
    expect(explain(given).path.map(line)).toEqual([
      'Bay B1: 75; 60 in at the top, at every height; taped level, it is divided by the cosine of 36.87° (from rise and going): times 1.25',
      'Post P2: 4.375; passed on a slope: its size along, 3 1/2 in, times 1.25 (½ / cos before + ½ / cos after). Its hole’s centre lies at 16 11/16 in on the downhill face, at 19 5/16 in on the other',
      'Bay B2: 75; 75 in at the top, at every height; taped along the slope of 36.87° (from rise and going), it counts as read',
    ])
    expect(explain(given).limits.map(({ kind }) => kind)).toEqual([
      'reading',
      'reading',
      'reading',
      'angle',
      'cut',
      'seat',
      'seat',
    ])
  })

  it('tells what the angles were taken with, and where the hole of a post between level and stair lies', () => {
    const stair = { kind: 'stair', taped: 'level' }
    const of = (first: Record<string, unknown>, second: Record<string, unknown>) =>
      explain({
        posts: [post('P1'), post('P2'), post('P3')],
        bays: [bay('B1', ['P1', 'P2'], [60], first), bay('B2', ['P2', 'P3'], [60], second)],
        fittings: [{ ...exampleFitting, maxAngle: 40 }],
        rules: { maxBend: 45 },
      })
    const angleReason = (working: ReturnType<typeof of>) =>
      text(working.limits.find(({ kind }) => kind === 'angle')?.reason)
    const gauged = { ...stair, gauge: 30 }
    const measured = { ...stair, rise: 30, going: 40 }
    expect(angleReason(of(gauged, gauged))).toMatch(/^one gauge, so its limits add up: /)
    expect(angleReason(of(measured, measured))).toMatch(/^angles from rise and going, whose limits add up/)
    expect(angleReason(of(gauged, measured))).toMatch(/^angles from gauge and from rise and going/)
    expect(angleReason(of({}, measured))).toMatch(/^the angle from rise and going: /)
    // 1 3/4 in from centre line to face, times 3/4.
    expect(line(of({}, measured).path[1]!)).toMatch(
      /Its hole’s centre lies toward bay B1 level, toward bay B2 1 5\/16 in lower where that goes down/,
    )
  })

  it('tells an overall reading and how often it was taken', () => {
    const readings = [48, 48.25].map((value, i) => ({ id: `o${i}`, at: 'top', value }))
    const { path, limits } = explain(oneBay({ run: { readings } }))
    expect(path.map(line)).toEqual([
      'Overall reading: 48.125; End face to end face: the mean of 2 readings, 48 1/8 in at the top, at every height',
    ])
    expect(text(limits[0]?.reason)).toBe('the house’s limit of one reading over √2, for 2 readings')
  })

  it('tells why one is finished on site', () => {
    const working = explain(
      oneBay({ rules: { readingLimit: 0 }, fittings: [{ ...exampleFitting, takeUp: 0.18 }] }),
    )
    expect(text(working.mode)).toBe(
      'Finished on site: cut in the shop it could need 0.3092 in, beyond the limit of 0.306 in',
    )
    expect(working.outcome.map(({ label }) => text(label))).toContain('Finish length')
  })

  it('tells that the run’s length was taken', () => {
    const given = oneBay({
      bays: [bay('B1', ['P1', 'P2'], [48.5, 48])],
      run: { cables: { heights: [3, 33] } },
      rules: { ...noLimits, grouping: 'run' },
    })
    expect(line(explain(given, 1).outcome[0]!)).toBe(
      'Cut length: 50; the longest cut of the run, which fits this cable too; its own would be 49 1/2 in',
    )
  })

  it('tells why one has no length', () => {
    const long = explain(oneBay({ bays: [bay('B1', ['P1', 'P2'], [250])] }))
    expect(text(long.mode)).toBe('Too long: the path of 250 in passes the longest, 240 in')
    const unread = explain(oneBay({ bays: [bay('B1', ['P1', 'P2'], [])] }))
    expect(unread).toMatchObject({ path: [], limits: [], outcome: [], result: { why: 'missing-reading' } })
    expect(text(explain(oneBay({ fittings: [] })).mode)).toBe('No length: no fitting suits one of the ends')
  })

  it('is nothing for a cable that is not there', () => {
    expect(explainCable(inputOf(oneBay()), { run: 'R1', cable: 2 })).toBeUndefined()
    expect(explainCable(inputOf(oneBay()), { run: 'R9', cable: 1 })).toBeUndefined()
  })
})
