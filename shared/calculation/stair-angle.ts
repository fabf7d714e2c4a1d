import type { Bay } from '../schemas/bay'
import type { HouseRules } from '../schemas/house-rules'
import { type Radians, toRadians } from '../units/angle'

export interface BayAngle {
  /** From the horizontal. */
  angle: Radians
  limit: Radians
  source: 'level' | 'rise-and-going' | 'gauge'
}

type Slope = Pick<Bay, 'kind' | 'rise' | 'going' | 'gauge'>

/**
 * The angle of a bay from the horizontal, and its limit.
 *
 * Formula: level 0; with rise and going `θ = atan2(rise, going)`, limit `readingLimit / √(rise² + going²)` rad;
 * else the gauge angle, limit `gaugeLimit`. Rise and going win where both were taken.
 * Units: radians; rise, going and readingLimit in nm; gauge and gaugeLimit in degrees.
 * Source: section 2 of the calculation; plane trigonometry.
 *
 * @returns undefined for a stair with neither
 * @example rise 52.5 in, going 75 in, readingLimit 1/16 in: θ = 34.992°, limit 0.0006827 rad = 0.0391°
 */
export function stairAngle(
  { kind, rise, going, gauge }: Slope,
  { readingLimit, gaugeLimit }: Pick<HouseRules, 'readingLimit' | 'gaugeLimit'>,
): BayAngle | undefined {
  if (kind === 'level') return { angle: 0, limit: 0, source: 'level' }
  if (rise !== undefined && going !== undefined) {
    const limit = readingLimit / Math.hypot(rise, going)
    return { angle: Math.atan2(rise, going), limit, source: 'rise-and-going' }
  }
  if (gauge === undefined) return undefined
  return { angle: toRadians(gauge), limit: toRadians(gaugeLimit), source: 'gauge' }
}

/** Above this a gauge and a rise and going disagree: 1°. */
export const ANGLE_AGREEMENT: Radians = toRadians(1)

/** How far the gauge is from rise and going, in radians; undefined unless both were taken. */
export function angleDisagreement({ kind, rise, going, gauge }: Slope): Radians | undefined {
  if (kind === 'level' || rise === undefined || going === undefined || gauge === undefined) return undefined
  return Math.abs(Math.atan2(rise, going) - toRadians(gauge))
}
