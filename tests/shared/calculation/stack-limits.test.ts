import { describe, expect, it } from 'vitest'
import { slop, stackLimits } from '@shared/calculation/stack-limits'
import { starterRules } from '@shared/calculation/starter-rules'
import { inches, toInches } from '@shared/units/length'

describe('stackLimits', () => {
  it('is the root of the sum of the squares, or the plain sum', () => {
    expect(stackLimits([3, 4, 12], 'rss')).toBe(13)
    expect(stackLimits([3, 4, 12], 'worst')).toBe(19)
    expect(stackLimits([], 'rss')).toBe(0)
  })
})

describe('slop', () => {
  const path = {
    length: 0,
    terms: [],
    readingLimits: [inches(3), inches(4)],
    tapeLimit: inches(12),
    angleLimit: inches(84),
  }
  const rules = { ...starterRules, cutLimit: inches(0), seatLimit: inches(0) }

  it('stacks readings, the summed tape and the summed angle', () => {
    // √(9 + 16 + 144 + 7056) = 85
    expect(toInches(slop(path, rules).u)).toBeCloseTo(85, 9)
    expect(slop(path, rules).us).toBe(0)
  })

  it('keeps one cut and two seats for the site', () => {
    // √(1 + 4 + 4) = 3
    const bench = { ...rules, cutLimit: inches(1), seatLimit: inches(2) }
    expect(toInches(slop(path, bench).us)).toBeCloseTo(3, 9)
    expect(toInches(slop(path, { ...bench, stacking: 'worst' }).us)).toBeCloseTo(5, 9)
    expect(toInches(slop(path, { ...bench, stacking: 'worst' }).u)).toBeCloseTo(108, 9)
  })
})
