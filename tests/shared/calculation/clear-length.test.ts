import { describe, expect, it } from 'vitest'
import { clearLength } from '@shared/calculation/clear-length'
import { inches, toInches } from '@shared/units/length'

const read = (mean: number, count = 1) => ({ mean: inches(mean), count, least: 0, greatest: 0 })
const readAt = { top: inches(33), bottom: inches(3) }

describe('clearLength', () => {
  const both = { top: read(46.5), bottom: read(46.25, 3) }

  it.each([
    // 46.25 + (28.75 − 3) / 30 · 0.25
    [28.75, 46.46458333],
    [3, 46.25],
    [33, 46.5],
    // Beyond the places: 46.25 − 0.025, 46.5 + 0.025
    [0, 46.225],
    [36, 46.525],
  ])('at %d in is %d in', (height, expected) => {
    expect(toInches(clearLength(both, inches(height), readAt)?.value ?? NaN)).toBeCloseTo(expected, 7)
  })

  it('counts the place that was read less', () => {
    expect(clearLength(both, 0, readAt)?.count).toBe(1)
    expect(clearLength({ ...both, top: read(46.5, 4) }, 0, readAt)?.count).toBe(3)
  })

  it('is the one place’s value at every height', () => {
    for (const height of [0, 20, 40]) {
      expect(clearLength({ top: read(44.125, 2) }, inches(height), readAt)).toEqual({
        value: inches(44.125),
        count: 2,
      })
      expect(clearLength({ bottom: read(44) }, inches(height), readAt)).toEqual({
        value: inches(44),
        count: 1,
      })
    }
  })

  it('is nothing without readings', () => {
    expect(clearLength({}, 0, readAt)).toBeUndefined()
  })

  it('is the mean where both places are at one height', () => {
    expect(clearLength(both, 0, { top: inches(18), bottom: inches(18) })?.value).toBe(inches(46.375))
  })
})
