import { describe, expect, it } from 'vitest'
import { tapeLimit } from '@shared/calculation/tape-limit'
import { inches, millimetres } from '@shared/units/length'

const millimetresOf = (nm: number) => nm / 1e6

describe('tapeLimit', () => {
  it('is 1.9 mm for 7.3 m of class II (2014/32/EU Annex X)', () => {
    expect(millimetresOf(tapeLimit(millimetres(7300), 'II'))).toBeCloseTo(1.9, 9)
  })

  it.each([
    ['I', 0.4], // 0.1 + 0.1 · 3
    ['II', 0.9], // 0.3 + 0.2 · 3
    ['III', 1.8], // 0.6 + 0.4 · 3
  ] as const)('of class %s over 2.5 m is %d mm', (tapeClass, expected) => {
    expect(millimetresOf(tapeLimit(millimetres(2500), tapeClass))).toBeCloseTo(expected, 9)
  })

  it('does not count another metre for a whole one', () => {
    expect(millimetresOf(tapeLimit(millimetres(2000) + 1e-4, 'II'))).toBeCloseTo(0.7, 9)
    expect(millimetresOf(tapeLimit(millimetres(2000) + 1, 'II'))).toBeCloseTo(0.9, 9)
    // 100 in is 2.54 m
    expect(millimetresOf(tapeLimit(inches(100), 'II'))).toBeCloseTo(0.9, 9)
  })

  it('is none without a class', () => {
    expect(tapeLimit(millimetres(7300), undefined)).toBe(0)
  })
})
