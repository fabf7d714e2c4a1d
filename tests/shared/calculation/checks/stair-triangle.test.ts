import { describe, expect, it } from 'vitest'
import { stairTriangle } from '@shared/calculation/checks/stair-triangle'
import { inches, toInches } from '@shared/units/length'

const tallest = inches(7.75)
const flight = (rise: number, going: number) => ({
  rise: inches(rise),
  going: inches(going),
  theta: Math.atan2(rise, going),
  tallest,
})

describe('stairTriangle', () => {
  it('is the incircle of the step: 7 1/2 by 10 in leaves 5 in (3-4-5 triangle, radius (a + b − c) / 2)', () => {
    const found = stairTriangle(flight(7.5, 10), 0)
    expect(toInches(found.sphere)).toBeCloseTo(5, 9)
    expect(found.assumed).toBe(false)
  })
  it('grows with the gap: 1 1/2 in above makes the triangle 9 by 12, and the sphere 6 in', () => {
    expect(toInches(stairTriangle(flight(7.5, 10), inches(1.5)).sphere)).toBeCloseTo(6, 9)
  })
  it('divides a whole flight into the fewest steps the rules allow', () => {
    // 52 1/2 in at 7 3/4 in at most are seven risers of 7 1/2 in, treads of 10 in.
    const found = stairTriangle(flight(52.5, 70), 0)
    expect([toInches(found.riser), toInches(found.tread)]).toEqual([7.5, 10])
    expect(found.assumed).toBe(true)
    expect(toInches(found.sphere)).toBeCloseTo(5, 9)
  })
  it('takes the tallest riser when only the angle is known', () => {
    const found = stairTriangle({ theta: Math.atan2(3, 4), tallest: inches(7.5) }, 0)
    expect(toInches(found.riser)).toBe(7.5)
    expect(toInches(found.tread)).toBeCloseTo(10, 9)
    expect(found.assumed).toBe(true)
  })
})
