import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { bay, calculate, codes, exampleFitting, type Given, inputOf, oneBay, post } from '../support/inputs'

const stair = { kind: 'stair', rise: 30, going: 40 }
const anyAngle = [{ ...exampleFitting, maxAngle: 90 }]

describe('a change of pitch', () => {
  const bent = (
    first: Record<string, unknown>,
    second: Record<string, unknown>,
    more: Partial<Given> = {},
  ) => ({
    posts: [post('P1'), post('P2'), post('P3')],
    bays: [bay('B1', ['P1', 'P2'], [40], first), bay('B2', ['P2', 'P3'], [40], second)],
    fittings: anyAngle,
    ...more,
  })

  it('is found at the post where it is', () => {
    const { findings } = calculate(bent({}, stair))
    expect(findings).toMatchObject([
      { level: 'check', code: 'pitch-changes', where: { run: 'R1', post: 'P2' } },
    ])
    expect(findings[0]?.text).toBe(
      'Run R1 changes its pitch by 36.87° at post P2: end the run here or protect the bend.',
    )
  })

  it('may be as much as the house allows', () => {
    expect(codes(bent({}, stair, { rules: { maxBend: 37 } }))).toEqual([])
    expect(codes(bent(stair, stair))).toEqual([])
  })
})

describe('the closure of an overall reading', () => {
  // Sum 46.5 + 3.5 + 44.125 = 94.125 in. Limits: four readings of 1/16 in: √4/16 = 1/8 in.
  const closing = (overall: number, more: Partial<Given> = {}): Given => ({
    posts: [post('P1'), post('P2'), post('P3')],
    bays: [bay('B1', ['P1', 'P2'], [46.5]), bay('B2', ['P2', 'P3'], [44.125])],
    run: { readings: [{ id: 'o1', at: 'top', value: overall }], cables: { layout: 'even', spacing: 3 } },
    ...more,
  })

  it('may be off by the limits of both, and no more', () => {
    expect(codes(closing(94.25))).toEqual([])
    expect(codes(closing(94))).toEqual([])
    expect(calculate(closing(94.26)).findings).toMatchObject([
      { level: 'check', code: 'closure', where: { run: 'R1' } },
    ])
    expect(calculate(closing(93.99)).findings[0]?.text).toContain('is 0.135 in shorter than its bays')
  })

  it('has the tape’s limits in it too', () => {
    // Tape: overall 2.39 m 0.9 mm, bays 0.7 + 0.7 mm = 0.0354331, 0.0551181 in; √(1/64 + 0.0012555 + 0.003038) = 0.141132.
    const rules = { tapeClass: 'II' }
    expect(codes(closing(94.125 + 0.141, { rules }))).toEqual([])
    expect(codes(closing(94.125 + 0.1413, { rules }))).toEqual(['closure'])
  })

  it('is not asked of a run whose bays are not complete', () => {
    const bays = [bay('B1', ['P1', 'P2'], []), bay('B2', ['P2', 'P3'], [44.125])]
    expect(codes(closing(99, { bays }))).toEqual([])
  })
})

describe('a run that is too long', () => {
  // Bays of 100 in and posts of 3.5: 100, 203.5, 307, 410.5; the fittings allow 240 in.
  const long = (bays: number): Given => ({
    posts: Array.from({ length: bays + 1 }, (_, i) => post(`P${i + 1}`)),
    bays: Array.from({ length: bays }, (_, i) => bay(`B${i + 1}`, [`P${i + 1}`, `P${i + 2}`], [100])),
    run: { cables: { heights: [6, 12, 18, 30] } },
  })
  const found = (given: Given) => calculate(given).findings

  it('is fine up to the fittings’ limit', () => {
    expect(found(long(2))).toEqual([])
  })

  it('is to end at the post that halves it best', () => {
    // Four bays: at P3 both halves are 203.5 in; at P2 or P4 the longer one is 307.
    expect(found(long(4))).toMatchObject([
      { level: 'stop', code: 'too-long', where: { run: 'R1', post: 'P3' } },
    ])
    expect(found(long(4))[0]?.text).toBe(
      'Run R1: cables 1 to 4, 410 1/2 in long, cannot be tensioned over more than 240 in. End the run at post P3.',
    )
  })

  it('names no post where none mends it', () => {
    // Five bays: the longer half is at least 307 in.
    expect(found(long(5))).toMatchObject([{ code: 'too-long', where: { run: 'R1' } }])
    expect(found(long(5))[0]?.where).not.toHaveProperty('post')
    expect(found(oneBay({ bays: [bay('B1', ['P1', 'P2'], [250])] }))[0]?.where).toEqual({ run: 'R1' })
  })

  it('names no post whose own fittings would not suit', () => {
    const { posts, ...rest } = long(4)
    posts[2] = post('P3', { material: 'metal' })
    expect(found({ ...rest, posts })[0]?.where).toEqual({ run: 'R1' })
  })
})

describe('what the survey names but nobody has', () => {
  it('is a cable the hardware lacks', () => {
    const input = inputOf(oneBay())
    const { cables, findings } = calculateSurvey({ ...input, hardware: { ...input.hardware, cables: [] } })
    expect(cables).toMatchObject([{ mode: 'none', why: 'no-fitting' }])
    expect(findings).toMatchObject([{ level: 'stop', code: 'cable-unknown', where: { run: 'R1' } }])
  })

  it('is a bay that is gone', () => {
    const input = inputOf(oneBay())
    const { runs, findings } = calculateSurvey({ ...input, survey: { ...input.survey, bays: [] } })
    expect(runs).toMatchObject([{ run: 'R1', cables: [] }])
    expect(findings).toMatchObject([{ level: 'stop', code: 'broken-run', where: { run: 'R1' } }])
  })
})
