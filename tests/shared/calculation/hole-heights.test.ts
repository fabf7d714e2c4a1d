import { describe, expect, it } from 'vitest'
import { holeHeights } from '@shared/calculation/hole-heights'
import { inches, toInches } from '@shared/units/length'

describe('holeHeights', () => {
  it('lies lower on the lower-going side, higher on the other', () => {
    // 1.75 · 0.75 = 1.3125
    const { lower, upper } = holeHeights(inches(20), inches(3.5), Math.atan2(3, 4))
    expect(toInches(lower)).toBeCloseTo(18.6875, 9)
    expect(toInches(upper)).toBeCloseTo(21.3125, 9)
  })
})
