import { describe, expect, it } from 'vitest'
import { angleDisagreement, stairAngle } from '@shared/calculation/stair-angle'
import { toDegrees, toRadians } from '@shared/units/angle'
import { inches } from '@shared/units/length'

const rules = { readingLimit: inches(1 / 16), gaugeLimit: 0.25 }

describe('stairAngle', () => {
  it('is level for a level bay, whatever else was noted', () => {
    expect(stairAngle({ kind: 'level', rise: inches(7), going: inches(10) }, rules)).toMatchObject({
      angle: 0,
      limit: 0,
    })
  })

  it('comes from rise and going before the gauge', () => {
    // atan(52.5/75) = 34.99202°; 0.0625 / √(52.5² + 75²) = 0.0625 / 91.5492 = 0.000682693 rad
    const angle = stairAngle({ kind: 'stair', rise: inches(52.5), going: inches(75), gauge: 40 }, rules)
    expect(angle?.source).toBe('rise-and-going')
    expect(toDegrees(angle?.angle ?? NaN)).toBeCloseTo(34.99202, 5)
    expect(angle?.limit).toBeCloseTo(0.000682693, 9)
  })

  it('comes from the gauge where rise or going is missing', () => {
    const angle = stairAngle({ kind: 'stair', rise: inches(52.5), gauge: 35 }, rules)
    expect(angle).toEqual({ angle: toRadians(35), limit: toRadians(0.25), source: 'gauge' })
  })

  it('is nothing for a stair with neither', () => {
    expect(stairAngle({ kind: 'stair', going: inches(75) }, rules)).toBeUndefined()
  })
})

describe('angleDisagreement', () => {
  it('is how far the gauge is from rise and going', () => {
    const apart = angleDisagreement({ kind: 'stair', rise: inches(3), going: inches(4), gauge: 38 })
    // atan(0.75) = 36.869898°
    expect(toDegrees(apart ?? NaN)).toBeCloseTo(1.130102, 6)
  })

  it('is nothing where only one was taken', () => {
    expect(angleDisagreement({ kind: 'stair', gauge: 38 })).toBeUndefined()
  })
})
