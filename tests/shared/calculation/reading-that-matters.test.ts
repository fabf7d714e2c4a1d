import { describe, expect, it } from 'vitest'
import { toInches } from '@shared/units/length'
import { bay, calculate, exampleFitting, type Given, oneBay, post } from './support/inputs'

const exactBench = { cutLimit: 0, seatLimit: 0 }
const times = (value: number, count: number) =>
  Array.from({ length: count }, (_, i) => ({ id: `r${i}`, at: 'top', value }))

/** Two bays of 40 in; the second was read four times. Fittings without stretch to spare. */
const twoBays = (takeUp: number, more: Partial<Given> = {}): Given => ({
  posts: [post('P1'), post('P2'), post('P3')],
  bays: [bay('B1', ['P1', 'P2'], [40]), bay('B2', ['P2', 'P3'], [], { readings: times(40, 4) })],
  fittings: [{ ...exampleFitting, takeUp }],
  rules: { ...exactBench, stacking: 'worst', reserve: 0 },
  ...more,
})

describe('the reading that matters', () => {
  // D 83.5, base 85 in, stretch 83.5 · 0.00224338 = 0.1873220. U = 1/16 (B1) + 1/32 (B2) + 1/16 (P2) = 5/32:
  // cut 85.1875, slack 0.1875; slack + U + stretch = 0.5310720. Halving B1: U = 1/8, cut 85.125: 0.4373220.
  it('is the one whose limit, halved, lessens U most', () => {
    const { runs, findings } = calculate(twoBays(0.25))
    const matters = runs[0]?.readingThatMatters
    expect(matters).toMatchObject({
      reading: { what: 'bay', bay: 'B1', place: 'top' },
      cable: 1,
      makesShop: true,
    })
    expect(toInches(matters?.before ?? NaN)).toBeCloseTo(5 / 32, 9)
    expect(toInches(matters?.after ?? NaN)).toBeCloseTo(1 / 8, 9)
    expect(findings).toMatchObject([
      { level: 'note', code: 'reading-that-matters', where: { run: 'R1', bay: 'B1' } },
    ])
    expect(findings[0]?.text).toBe(
      'Run R1: cable 1 must be finished on site only because the readings may be off by 5/32 in in all. Take the reading ' +
        'of bay B1 at the top again: with its limit halved that becomes 1/8 in, and both ends can be crimped in the shop.',
    )
  })

  it('may not be enough alone', () => {
    // Take-up 0.2 twice = 0.4: less than 0.4373220, more than the stretch alone.
    const { runs, findings } = calculate(twoBays(0.2))
    expect(runs[0]?.readingThatMatters).toMatchObject({ reading: { bay: 'B1' }, makesShop: false })
    expect(findings[0]?.text).toContain('helps most but is not yet enough')
  })

  it('is asked neither of shop cables nor of those no reading would mend', () => {
    expect(calculate(twoBays(0.27)).runs[0]).not.toHaveProperty('readingThatMatters')
    // Cut limit 1/8: even exact readings need 85.125 (slack 1/8) + 1/8 + 0.1873220 = 0.4373220, over 0.4.
    const coarse = twoBays(0.2, { rules: { cutLimit: 0.125, seatLimit: 0, stacking: 'worst', reserve: 0 } })
    const { cables, runs } = calculate(coarse)
    expect(cables[0]?.mode).toBe('site')
    expect(runs[0]).not.toHaveProperty('readingThatMatters')
  })

  it('may be a post’s size, an overall reading, rise and going, or the gauge', () => {
    const sixteenReadings = (id: string, ends: [string, string]) =>
      bay(id, ends, [], { readings: times(40, 16) })
    const post2 = twoBays(0.2, {
      bays: [sixteenReadings('B1', ['P1', 'P2']), sixteenReadings('B2', ['P2', 'P3'])],
    })
    // U = 1/64 + 1/64 + 1/16 = 3/32: 85.125 − 85 + 0.09375 + 0.187322 = 0.406072, over 0.4.
    expect(calculate(post2).runs[0]?.readingThatMatters?.reading).toEqual({
      what: 'post',
      post: 'P2',
      side: 'along',
    })

    const overall = oneBay({
      run: { readings: [{ id: 'o', at: 'top', value: 83.5 }] },
      bays: [bay('B1', ['P1', 'P2'], [])],
      fittings: [{ ...exampleFitting, takeUp: 0.15 }],
      rules: { ...exactBench, reserve: 0 },
    })
    // U = 1/16, cut 85.0625: 0.0625 + 0.0625 + 0.187322 = 0.312322, over 0.3.
    expect(calculate(overall).runs[0]?.readingThatMatters?.reading).toEqual({ what: 'overall' })

    const stair = (angle: object) =>
      oneBay({
        bays: [bay('B1', ['P1', 'P2'], [60], { kind: 'stair', taped: 'level', ...angle })],
        fittings: [{ ...exampleFitting, maxAngle: 60, takeUp: 0.2 }],
        rules: { ...exactBench, reserve: 0 },
      })
    // Rise and going 3 and 4 in: 60 · 0.75/0.8 · 0.0125 = 0.703 in, far above the reading's 0.078.
    const steps = calculate(stair({ rise: 3, going: 4 })).runs[0]?.readingThatMatters
    expect(steps?.reading).toEqual({ what: 'rise-and-going', bay: 'B1' })
    // Gauge 37°: 60 · 0.7536/0.7986 · 0.00436 = 0.247 in.
    const gauge = calculate(stair({ gauge: 37 })).runs[0]?.readingThatMatters
    expect(gauge?.reading).toEqual({ what: 'gauge', bay: 'B1' })
  })

  it('names the place that was read less', () => {
    const readings = [...times(40, 4), { id: 'b', at: 'bottom', value: 40 }]
    const bays = [
      bay('B1', ['P1', 'P2'], [], { readings }),
      bay('B2', ['P2', 'P3'], [], { readings: times(40, 4) }),
    ]
    expect(calculate(twoBays(0.25, { bays })).runs[0]?.readingThatMatters?.reading).toMatchObject({
      place: 'bottom',
    })
    const both = [bay('B1', ['P1', 'P2'], [40, 40]), bays[1]!]
    expect(calculate(twoBays(0.25, { bays: both })).runs[0]?.readingThatMatters?.reading).toMatchObject({
      place: 'both',
    })
  })
})
