import { expect, it } from 'vitest'
import { writeAngle } from '@shared/units/format-angle'

it.each([
  [34.992, '35°'],
  [34.94, '34.9°'],
  [-0.04, '0°'],
  [-5.25, '−5.3°'],
])('writes %d as %s', (degrees, text) => {
  expect(writeAngle(degrees)).toBe(text)
})

it('refuses what is no angle', () => {
  expect(() => writeAngle(Number.NaN)).toThrow(RangeError)
})
