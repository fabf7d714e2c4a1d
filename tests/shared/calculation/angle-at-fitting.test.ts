import { describe, expect, it } from 'vitest'
import { angleAtFitting } from '@shared/calculation/angle-at-fitting'
import { toRadians } from '@shared/units/angle'

describe('angleAtFitting', () => {
  it.each([
    [0, 0, 0],
    [35, 0, 35],
    [0, -12, 12],
    // cos 35° · cos 10° = 0.8191520 · 0.9848078 = 0.8067073
    [35, 10, 36.2245],
  ])('θ %d° and skew %d° make %d°', (theta, skew, expected) => {
    expect(angleAtFitting(toRadians(theta), skew)).toBeCloseTo(expected, 4)
  })
})
