import { describe, expect, it } from 'vitest'
import { toInches } from '@shared/units/length'
import { bay, type Given, noLimits, onlyCable, oneBay, post } from './support/inputs'

const stair = { kind: 'stair', rise: 3, going: 4 } // cos θ = 0.8, tan θ = 0.75, θ = 36.87°
const steep = { maxAngle: 50 }
const fitting = (more: object) => ({
  id: 'F1',
  name: 'Any',
  mount: 'surface',
  materials: ['softwood'],
  cables: ['c532'],
  body: 0,
  headProjection: 0,
  cutPastFace: 0,
  takeUp: 3,
  ...more,
})
const flush = [fitting(steep)]

const path = (given: Given) => toInches(onlyCable({ fittings: flush, ...given }).path ?? NaN)
/** U in inches with the cut and the seats exact, so that only what was measured stacks. */
const measuredSlop = (given: Given) =>
  toInches(
    onlyCable({ fittings: flush, ...given, rules: { cutLimit: 0, seatLimit: 0, ...given.rules } }).u ?? NaN,
  )

describe('a level run', () => {
  const given = {
    posts: [post('P1'), post('P2', { along: 5.5 }), post('P3')],
    bays: [bay('B1', ['P1', 'P2'], [46.5]), bay('B2', ['P2', 'P3'], [44.125])],
  }

  it('is its bays and the posts passed', () => {
    // 46.5 + 5.5 + 44.125
    expect(path(given)).toBe(96.125)
  })

  it('has one limit for each bay and post passed', () => {
    // √3 / 16 = 0.1082532
    expect(measuredSlop(given)).toBeCloseTo(0.1082532, 7)
    expect(measuredSlop({ ...given, rules: { stacking: 'worst' } })).toBeCloseTo(3 / 16, 9)
  })

  it('has a smaller limit where a bay was read more often', () => {
    const readings = [46.5, 46.5, 46.5, 46.5].map((value, i) => ({ id: `r${i}`, at: 'top', value }))
    // (1/16)² · (1/4 + 1 + 1) = 2.25/256 → 1.5/16
    expect(measuredSlop({ ...given, bays: [{ ...given.bays[0], readings }, given.bays[1]!] })).toBeCloseTo(
      1.5 / 16,
      9,
    )
  })

  it('adds up the tape limits of its bays, as one tape read them', () => {
    // Each bay 1.1 to 1.2 m: 0.3 + 0.2 · 2 = 0.7 mm; together 1.4 mm = 0.0551181 in.
    expect(measuredSlop({ ...given, rules: { readingLimit: 0, tapeClass: 'II' } })).toBeCloseTo(1.4 / 25.4, 9)
  })
})

describe('a stair taped level', () => {
  const given = oneBay({ bays: [bay('B1', ['P1', 'P2'], [60], { ...stair, taped: 'level' })] })

  it('is divided by the cosine', () => {
    // 60 / 0.8
    expect(path(given)).toBeCloseTo(75, 9)
  })

  it('has its reading and tape limits divided too', () => {
    const square = {
      ...given,
      bays: [bay('B1', ['P1', 'P2'], [60], { ...stair, rise: 3000, going: 4000, taped: 'level' })],
    }
    // Reading 0.0625/0.8 = 0.078125; angle 60 · 0.75/0.8 · 0.0625/5000 = 0.000703125. √ of the squares = 0.0781282.
    expect(measuredSlop(square)).toBeCloseTo(0.0781282, 7)
    // Tape: 60 in = 1.524 m, 0.7 mm / 0.8 = 0.875 mm = 0.0344488 in.
    const taped = { ...square, rules: { readingLimit: 0, tapeClass: 'II' } }
    expect(measuredSlop(taped)).toBeCloseTo(0.0344488, 6)
  })

  it('adds what the angle may be off by', () => {
    // Rise and going 30 and 40 in: limit 0.0625/50 = 0.00125 rad; 60 · 0.75/0.8 · 0.00125 = 0.0703125.
    // With the reading: √(0.078125² + 0.0703125²) = 0.1051064.
    const step = { ...stair, rise: 30, going: 40, taped: 'level' }
    expect(measuredSlop({ ...given, bays: [bay('B1', ['P1', 'P2'], [60], step)] })).toBeCloseTo(0.1051064, 6)
  })

  it('takes the gauge’s limit where the gauge gave the angle', () => {
    // θ 30°: 60 · tan 30° / cos 30° · 0.25° = 60 · 0.5773503/0.8660254 · 0.00436332 = 0.1745329.
    const gauged = { kind: 'stair', gauge: 30, taped: 'level' }
    const exact = { ...given, bays: [bay('B1', ['P1', 'P2'], [60], gauged)], rules: { readingLimit: 0 } }
    expect(measuredSlop(exact)).toBeCloseTo(0.1745329, 6)
    expect(path(exact)).toBeCloseTo(69.2820323, 6)
  })

  it('adds up the angle limits of its bays, as one gauge read them', () => {
    const gauged = { kind: 'stair', gauge: 30, taped: 'level' }
    const two = {
      posts: [post('P1'), post('P2'), post('P3')],
      bays: [bay('B1', ['P1', 'P2'], [60], gauged), bay('B2', ['P2', 'P3'], [60], gauged)],
      rules: { readingLimit: 0 },
    }
    expect(measuredSlop(two)).toBeCloseTo(2 * 0.1745329, 6)
  })
})

describe('a stair taped along the slope', () => {
  const given = oneBay({ bays: [bay('B1', ['P1', 'P2'], [75], { ...stair, taped: 'slope' })] })

  it('counts as read', () => {
    expect(path(given)).toBe(75)
    expect(measuredSlop(given)).toBeCloseTo(1 / 16, 9)
  })
})

describe('a post passed on a slope', () => {
  const three = (first: Record<string, unknown>, second: Record<string, unknown>): Given => ({
    posts: [post('P1'), post('P2'), post('P3')],
    bays: [bay('B1', ['P1', 'P2'], [50], first), bay('B2', ['P2', 'P3'], [50], second)],
  })

  it('counts half by each bay’s pitch', () => {
    // Stair both sides: 3.5 / 0.8 = 4.375. Level, then stair: 3.5 · (0.5 + 0.625) = 3.9375.
    expect(path(three(stair, stair))).toBeCloseTo(104.375, 9)
    expect(path(three({}, stair))).toBeCloseTo(103.9375, 9)
    expect(path(three(stair, {}))).toBeCloseTo(103.9375, 9)
  })

  it('has its reading limit times the same factor', () => {
    // Bays 1/16 each, post 1.125/16: √(1 + 1 + 1.265625)/16 = 0.1129440
    expect(measuredSlop(three({}, stair))).toBeCloseTo(0.112944, 6)
  })
})

describe('an overall reading', () => {
  const read = (value: number, at: string, id = `o${value}`) => ({ id, at, value })
  const two = (readings: object[], more: Partial<Given> = {}): Given => ({
    posts: [post('P1'), post('P2'), post('P3')],
    bays: [bay('B1', ['P1', 'P2'], [46.5]), bay('B2', ['P2', 'P3'], [44.125])],
    run: { readings },
    ...more,
  })

  it('is the path, with one reading limit and its tape limit', () => {
    expect(path(two([read(94, 'top')]))).toBe(94)
    expect(measuredSlop(two([read(94, 'top')]))).toBeCloseTo(1 / 16, 9)
    // 94 in = 2.3876 m: 0.3 + 0.2 · 3 = 0.9 mm
    const taped = two([read(94, 'top')], { rules: { readingLimit: 0, tapeClass: 'II' } })
    expect(measuredSlop(taped)).toBeCloseTo(0.9 / 25.4, 9)
  })

  it('is interpolated as a bay is', () => {
    // 18 in is half way between 3 and 33 in.
    expect(path(two([read(94.25, 'top'), read(94, 'bottom')]))).toBe(94.125)
  })

  it('needs no bay read and no post passed measured', () => {
    const given = two([read(94, 'top')], {
      posts: [post('P1'), { id: 'P2' }, post('P3')],
      bays: [bay('B1', ['P1', 'P2'], []), bay('B2', ['P2', 'P3'], [44.125])],
    })
    expect(onlyCable({ ...given, fittings: flush }).mode).toBe('shop')
  })

  it('does not count once it is struck', () => {
    expect(path(two([{ ...read(94, 'top'), struck: 'end of the tape slipped' }]))).toBe(94.125)
  })
})

describe('a file in millimetres', () => {
  it('is exact to the tenth of a millimetre', () => {
    const given: Given = {
      units: { length: 'mm', force: 'N' },
      posts: [post('P1', { along: 90 }), post('P2', { along: 90 }), post('P3', { along: 90 })],
      bays: [bay('B1', ['P1', 'P2'], [1181.1]), bay('B2', ['P2', 'P3'], [1120.8])],
      run: { cables: { heights: [457] }, tension: 667 },
      cables: [{ id: 'c532', name: 'Four', construction: '7x7', diameter: 4, axialStiffness: 671000 }],
      fittings: [fitting({ headProjection: 6, cutPastFace: 25, takeUp: 19 })],
      rules: { ...noLimits, cutStep: 1, trim: 100 },
    }
    const cable = onlyCable(given)
    // 1181.1 + 90 + 1120.8 = 2391.9; + 2 · 19 = 2429.9, up to a whole millimetre 2430.
    expect(cable.path).toBe(2_391_900_000)
    expect(cable.cut).toBe(2_430_000_000)
    // 2391.9 · (667/671000 + 0.00125) = 2391.9 · 0.0022440387 = 5.3675162 mm, and 0.1 of slack
    expect((cable.planned ?? NaN) / 1e6).toBeCloseTo(5.4675162, 6)
  })
})
