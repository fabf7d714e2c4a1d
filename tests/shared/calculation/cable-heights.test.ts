import { describe, expect, it } from 'vitest'
import { cableHeights } from '@shared/calculation/cable-heights'
import type { CableLayout } from '@shared/schemas/run'
import { inches, toInches } from '@shared/units/length'

const under = (top: number, bottom = 0) => ({ bottom: inches(bottom), top: inches(top) })
const level = { flattest: 0, holeStep: inches(1 / 16) }
const layout = (kind: 'even' | 'fixed', spacing: number): CableLayout => ({
  layout: kind,
  spacing: inches(spacing),
})
const heightsOf = (...args: Parameters<typeof cableHeights>) => cableHeights(...args).heights.map(toInches)

describe('cableHeights', () => {
  it('makes equal openings no wider than the spacing', () => {
    // ⌈34.5 / 3⌉ − 1 = 11, openings of 2.875
    expect(heightsOf(layout('even', 3), under(34.5), level)).toEqual([
      2.875, 5.75, 8.625, 11.5, 14.375, 17.25, 20.125, 23, 25.875, 28.75, 31.625,
    ])
  })

  it('puts eleven, not twelve, where the spacing divides the opening', () => {
    expect(heightsOf(layout('even', 3), under(36), level)).toEqual([3, 6, 9, 12, 15, 18, 21, 24, 27, 30, 33])
  })

  it('goes down from the rail by a fixed spacing, the remainder at the bottom', () => {
    expect(heightsOf(layout('fixed', 3), under(34.5), level)).toEqual([
      1.5, 4.5, 7.5, 10.5, 13.5, 16.5, 19.5, 22.5, 25.5, 28.5, 31.5,
    ])
    expect(heightsOf(layout('fixed', 3), under(36), level)[0]).toBe(3)
  })

  it('rounds to the nearest hole step, halves up', () => {
    // Openings of 34 / 12 = 2.8333 in: 2.8333 → 2.8125, 5.6667 → 5.6875, 8.5 → 8.5
    expect(heightsOf(layout('even', 3), under(34), level).slice(0, 3)).toEqual([2.8125, 5.6875, 8.5])
    // One cable at 2 1/32 in, half way between sixteenths
    expect(heightsOf(layout('even', 3), under(4.0625), level)).toEqual([2.0625])
  })

  it('spreads them on a stair, the spacing being square to the cable', () => {
    // cos θ = 0.8: p = 3.75; ⌈34.5 / 3.75⌉ − 1 = ⌈9.2⌉ − 1 = 9 cables, openings of 3.45: 3.45 → 3.4375
    const stair = { ...level, flattest: Math.atan2(3, 4) }
    const heights = heightsOf(layout('even', 3), under(34.5), stair)
    expect(heights).toHaveLength(9)
    expect(heights.slice(0, 2)).toEqual([3.4375, 6.875])
    // Fixed: 34.5 − 3.75 = 30.75, down to 34.5 − 33.75 = 0.75
    const fixed = heightsOf(layout('fixed', 3), under(34.5), stair)
    expect([fixed.at(-1), fixed[0]]).toEqual([30.75, 0.75])
  })

  it('lets explicit heights win, from the lowest, unrounded', () => {
    const heights = { heights: [inches(20.03), inches(4)] }
    expect(heightsOf(heights, under(34.5), level)).toEqual([4, 20.03])
  })

  it('has none where none fits', () => {
    expect(heightsOf(layout('even', 3), under(3), level)).toEqual([])
    expect(heightsOf(layout('even', 3), under(2, 5), level)).toEqual([])
    expect(heightsOf({ layout: 'even', spacing: 1 as never }, under(36), level)).toEqual([])
  })
})
