import { describe, expect, it } from 'vitest'
import { cornerHoles, leastApart } from '@shared/calculation/checks/corner-holes'
import { inches, toInches } from '@shared/units/length'

const rules = { cornerOverlap: inches(1 / 16), cornerWeb: inches(1 / 4) }
const square = { along: inches(3.5), across: inches(3.5) }
const hole = (body: number, diameter = 9 / 16) => ({ body: inches(body), diameter: inches(diameter) })

describe('cornerHoles', () => {
  it('lets two 1 1/2 in bodies in 9/16 in holes in a 3 1/2 in post overlap 1/32 in (common practice, no source)', () => {
    // 1 1/2 − (1 3/4 − 9/32) = 1/32 either way.
    const { overlap, stagger } = cornerHoles({ a: hole(1.5), b: hole(1.5) }, square, rules)
    expect(toInches(overlap)).toBe(1 / 32)
    expect(stagger).toBe(0)
  })
  it('asks for a stagger just above the limit and not at it', () => {
    const at = (body: number) => cornerHoles({ a: hole(body), b: hole(body) }, square, rules)
    // The limit is 1/16: bodies of 1 17/32 in overlap exactly that.
    expect(toInches(at(1.5 + 1 / 32).overlap)).toBe(1 / 16)
    expect(at(1.5 + 1 / 32).stagger).toBe(0)
    expect(at(1.5 + 1 / 64).stagger).toBe(0)
    // 9/32 + 9/32 + 1/4 in.
    expect(toInches(at(1.5 + 3 / 64).stagger)).toBe(13 / 16)
  })
  it('goes by the shallower of the two, and by each one’s own side of the post', () => {
    const { overlap } = cornerHoles(
      { a: hole(3), b: hole(1.5) },
      { along: inches(5), across: inches(3) },
      rules,
    )
    // A: 3 − (2.5 − 9/32) = 25/32; B: 1.5 − (1.5 − 9/32) = 9/32.
    expect(toInches(overlap)).toBe(9 / 32)
    expect(toInches(cornerHoles({ a: hole(1), b: hole(1) }, square, rules).overlap)).toBe(-15 / 32)
  })
})

describe('leastApart', () => {
  it('is the least difference between two runs’ heights', () => {
    expect(leastApart([3, 6, 9], [4.5, 8, 20])).toBe(1)
    expect(leastApart([3, 6, 9], [3, 6, 9])).toBe(0)
    expect(leastApart([10], [1, 2, 3])).toBe(7)
    expect(leastApart([1, 2, 3], [10])).toBe(7)
    expect(leastApart([], [1])).toBe(Infinity)
  })
})
