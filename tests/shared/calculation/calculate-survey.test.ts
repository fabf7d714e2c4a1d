import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import type { CableResult } from '@shared/calculation/result'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import { readSurveyFile } from '@shared/schemas/survey-file'
import { toInches } from '@shared/units/length'
import { bay, calculate, exampleFitting, inputOf, noLimits, onlyCable, oneBay } from './support/inputs'

const inches = (nm: number | undefined) => toInches(nm ?? NaN)

describe('the worked example', () => {
  // Posts 3.5 in softwood, softwood, hardwood; bays 46.5 (top) / 46.25 (bottom) and 44.125; the expected figures are those
  // printed in the description of the main job.
  const file = readSurveyFile(JSON.parse(readFileSync('tests/worked-examples/in/two-bays.json', 'utf8')))
  const { cables, findings } = calculateSurvey({
    survey: file.survey,
    hardware: file.hardware ?? starterHardware,
    rules: file.rules ?? starterRules,
  })

  it('has eleven cables, from 2 7/8 to 31 5/8 in', () => {
    expect(cables.map(({ height }) => inches(height))).toEqual([
      2.875, 5.75, 8.625, 11.5, 14.375, 17.25, 20.125, 23, 25.875, 28.75, 31.625,
    ])
    expect(findings).toEqual([])
  })

  it('gives cable 10 its figures', () => {
    const cable = cables[9] as CableResult
    expect(cable).toMatchObject({ run: 'R1', cable: 10, mode: 'shop', from: 'F1', to: 'F1' })
    expect(inches(cable.path)).toBeCloseTo(94.0895833, 7)
    expect(inches(cable.u)).toBeCloseTo(0.1435832, 7)
    expect(inches(cable.cut)).toBe(95.75)
    expect(inches(cable.slack)).toBeCloseTo(0.1604167, 7)
    expect(inches(cable.planned)).toBeCloseTo(0.3714951, 7)
    expect(inches(cable.worst)).toBeCloseTo(0.5150783, 7)
    expect(inches(cable.limit)).toBeCloseTo(1.275, 10)
    expect(inches(cable.longest)).toBe(240)
  })

  it('cuts cable 11 at 95 13/16 in', () => {
    expect(inches(cables[10]?.cut)).toBe(95.8125)
  })
})

describe('common practice', () => {
  it('cuts post face to post face and 1 1/2 in when nothing may be off', () => {
    // 48 + 3/4 + 3/4 in, and no step more for the noise of sums.
    expect(inches(onlyCable(oneBay({ rules: noLimits })).cut)).toBe(49.5)
  })

  it('finds a run of 20 ft feasible at 150 lbf with 5/32 in 7x7 and fittings of 3/4 in travel', () => {
    const twentyFeet = oneBay({ bays: [bay('B1', ['P1', 'P2'], [240])] })
    // 240 · (150/151000 + 0.00125) = 0.538411 in of stretch, within 1.275.
    expect(onlyCable(twentyFeet).mode).toBe('shop')
    const { cables } = calculateSurvey({
      ...inputOf(twentyFeet),
      hardware: starterHardware,
      rules: starterRules,
    })
    expect(cables.map(({ mode }) => mode)).toEqual(['shop'])
  })
})

describe('modes', () => {
  // One bay of 48 in, no reading or tape limits; cut 1/16 and seats 1/32, 1/32 by rss: U = Us = √6/64 = 0.0765466 in.
  // Strain 150/151000 + 0.00125 = 0.00224338; stretch 48 in · that = 0.1076821 in.
  const bench = { readingLimit: 0 }

  it('crimps both ends in the shop where that fits', () => {
    // base 49.5, + U = 49.5765 → 49.625: slack 0.125, planned 0.2326821, worst 0.3092287; limit 1.275.
    const cable = onlyCable(oneBay({ rules: bench }))
    expect(cable.mode).toBe('shop')
    expect(inches(cable.cut)).toBe(49.625)
    expect(inches(cable.slack)).toBeCloseTo(0.125, 9)
    expect(inches(cable.planned)).toBeCloseTo(0.2326821, 6)
    expect(inches(cable.worst)).toBeCloseTo(0.3092287, 6)
    expect(cable).not.toHaveProperty('finish')
  })

  it('adds the plain limits when stacking the worst case', () => {
    // U = 1/16 + 1/32 + 1/32 = 1/8: 49.5 + 0.125 = 49.625 exactly, worst 0.125 + 0.1076821 + 0.125.
    const cable = onlyCable(oneBay({ rules: { ...bench, stacking: 'worst' } }))
    expect(inches(cable.u)).toBeCloseTo(0.125, 12)
    expect(inches(cable.cut)).toBe(49.625)
    expect(inches(cable.worst)).toBeCloseTo(0.3576821, 6)
  })

  it('finishes on site what would not fit', () => {
    // Take-up 0.18 twice, less 15 %: 0.306 in, just under the worst of 0.3092287; Us + stretch = 0.1842287 fits.
    // Shop length: 49.5 + 0.0765466 + 4 = 53.5765 → 53.625; finish 49.5.
    const cable = onlyCable(oneBay({ rules: bench, fittings: [{ ...exampleFitting, takeUp: 0.18 }] }))
    expect(cable.mode).toBe('site')
    expect(inches(cable.limit)).toBeCloseTo(0.306, 9)
    expect(inches(cable.cut)).toBe(53.625)
    expect(inches(cable.finish)).toBe(49.5)
    expect(inches(cable.u)).toBeCloseTo(0.0765466, 6)
    expect(inches(cable.planned)).toBeCloseTo(0.1076821, 6)
    expect(inches(cable.worst)).toBeCloseTo(0.1842287, 6)
    expect(cable).not.toHaveProperty('slack')
  })

  it('gives no length where even the stretch does not fit', () => {
    // Take-up 0.1 twice, less 15 %: 0.17; longest (0.17 − 0.0765466) / 0.00224338 = 41.6576 in, under 48.
    const cable = onlyCable(oneBay({ rules: bench, fittings: [{ ...exampleFitting, takeUp: 0.1 }] }))
    expect(cable).toMatchObject({ mode: 'none', why: 'too-long', from: 'F1', to: 'F1' })
    expect(inches(cable.path)).toBe(48)
    expect(inches(cable.longest)).toBeCloseTo(41.6576, 3)
    expect(inches(cable.limit)).toBeCloseTo(0.17, 9)
    expect(cable).not.toHaveProperty('cut')
  })

  it('takes the run’s own tension before the house’s', () => {
    // 300 lbf: 48 · (300/151000 + 0.00125) = 0.1553642 in.
    const cable = onlyCable(oneBay({ rules: { ...noLimits }, run: { tension: 300 } }))
    expect(inches(cable.planned)).toBeCloseTo(0.1553642, 6)
  })

  it('has no limit of its own where a fitting has no longest run', () => {
    const { maxRun: _, ...fitting } = exampleFitting
    const cable = onlyCable(oneBay({ fittings: [fitting], rules: noLimits }))
    // 1.275 / 0.00224338 = 568.3404 in
    expect(inches(cable.longest)).toBeCloseTo(568.34, 2)
  })
})

describe('one length for a run', () => {
  // Bay 48.5 in at 33 in and 48 in at 3 in; cables at 3 and 33 in. Nothing may be off: cuts 49.5 and 50 in.
  const slanted = (fitting: object, more: object = {}) =>
    calculate(
      oneBay({
        bays: [bay('B1', ['P1', 'P2'], [48.5, 48])],
        run: { cables: { heights: [3, 33] } },
        fittings: [{ ...exampleFitting, ...fitting }],
        rules: { ...noLimits, grouping: 'run', ...more },
      }),
    ).cables

  it('is the longest cut where every cable can take it', () => {
    expect(slanted({}).map(({ cut }) => inches(cut))).toEqual([50, 50])
    expect(slanted({}).map(({ slack }) => inches(slack))).toEqual([0.5, 0])
  })

  it('is given up where one cable cannot', () => {
    // Cable 1 would need 0.5 + 0.1076821 in, cable 2 0.1088038; take-up 0.3 twice less 15 % is 0.51.
    expect(slanted({ takeUp: 0.3 }).map(({ cut }) => inches(cut))).toEqual([49.5, 50])
    expect(slanted({ takeUp: 0.3 }).map(({ mode }) => mode)).toEqual(['shop', 'shop'])
  })

  it('is not asked for by the rule "cable"', () => {
    expect(slanted({}, { grouping: 'cable' }).map(({ cut }) => inches(cut))).toEqual([49.5, 50])
  })
})
