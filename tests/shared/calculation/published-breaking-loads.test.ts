import { describe, expect, it } from 'vitest'
import { publishedBreakingLoad, startingBreakingLoad } from '@shared/calculation/published-breaking-loads'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { toPoundsForce } from '@shared/units/force'
import { inches } from '@shared/units/length'

describe('published breaking strength', () => {
  // MIL-W-83420 as in FAA AC 43.13-1B, table 7-3; 7x7 is listed only to 3/32 in.
  it.each([
    ['7x19', 1 / 8, 1760],
    ['7x19', 5 / 32, 2400],
    ['7x19', 3 / 16, 3700],
    ['7x19', 1 / 4, 6400],
    ['7x7', 3 / 32, 920],
  ] as const)('of %s %d in: %d lbf', (construction, diameter, load) => {
    expect(
      toPoundsForce(publishedBreakingLoad({ construction, diameter: inches(diameter) }) ?? 0),
    ).toBeCloseTo(load, 9)
  })
  it('is not known of thicker 7x7, nor of strand', () => {
    expect(publishedBreakingLoad({ construction: '7x7', diameter: inches(1 / 8) })).toBeUndefined()
    expect(publishedBreakingLoad({ construction: '1x19', diameter: inches(1 / 8) })).toBeUndefined()
  })
})

describe('the starter cables', () => {
  it('start below the published strength, type 316 being weaker', () => {
    // 0.8 · 1760, 2400, 3700 = 1408, 1920, 2960, rounded down to 50.
    expect([1 / 8, 5 / 32, 3 / 16].map(startingBreakingLoad)).toEqual([1400, 1900, 2950])
    expect(
      starterHardware.cables.map(({ breakingLoad = 0 }) => Math.round(toPoundsForce(breakingLoad))),
    ).toEqual([1400, 1900, 2950])
    expect(() => startingBreakingLoad(0.3)).toThrow(RangeError)
  })
})
