import { describe, expect, it } from 'vitest'
import { closure } from '@shared/calculation/closure'
import { inches, toInches } from '@shared/units/length'

describe('closure', () => {
  it('is overall less sum, against both totals’ limits', () => {
    const total = (length: number, readingLimits: number[]) => ({
      length: inches(length),
      terms: [],
      readingLimits,
      tapeLimit: 0,
      angleLimit: 0,
    })
    const sixteenth = inches(1 / 16)
    const found = closure(total(94.5, [sixteenth]), total(94.125, [sixteenth, sixteenth, sixteenth]))
    expect(toInches(found.gap)).toBe(0.375)
    // √(4 · 1/256) = 1/8
    expect(toInches(found.limit)).toBeCloseTo(0.125, 12)
  })
})
