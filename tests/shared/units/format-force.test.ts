import { expect, it } from 'vitest'
import { writeForce } from '@shared/units/format-force'

// 150 lbf × 4.4482216152605 (NIST SP 811) = 667.233 N
it.each([
  [667.233, 'lbf', '150 lbf'],
  [667.233, 'N', '667 N'],
  [-0.2, 'N', '0 N'],
  [-10, 'N', '−10 N'],
] as const)('writes %d N in %s as %s', (force, unit, text) => {
  expect(writeForce(force, unit)).toBe(text)
})

it('refuses what is no force', () => {
  expect(() => writeForce(Infinity, 'N')).toThrow(RangeError)
})
