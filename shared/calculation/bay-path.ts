import type { Bay } from '../schemas/bay'
import type { Guard } from '../schemas/guard'
import type { HouseRules } from '../schemas/house-rules'
import { clearLength, type GapReadings } from './clear-length'
import type { BayAngle } from './stair-angle'
import { tapeLimit } from './tape-limit'

/** A bay along a cable; all lengths and limits in nm, unrounded. */
export interface BayPath {
  kind: 'bay'
  bay: Bay
  readings: GapReadings
  /** As taped, at the cable's height. */
  clear: number
  /** How many readings bear on it. */
  count: number
  angle: BayAngle
  /** What clear is multiplied by to lie along the cable: 1, or 1 / cos θ for a stair taped level. */
  factor: number
  value: number
  readingLimit: number
  tapeLimit: number
  angleLimit: number
}

/**
 * The length of a bay along a cable, and its limits.
 *
 * Formula: level, or a stair taped along the slope: the clear length as read. A stair taped level: clear / cos θ,
 * its reading limit `readingLimit / √n` and tape limit divided likewise, and an angle limit
 * `clear · tan θ / cos θ · (limit of θ)`. The tape limit is that of the clear length as taped.
 * Units: nm.
 * Source: section 3 of the calculation; the angle limit is the derivative of clear / cos θ.
 *
 * @returns undefined when nothing was read
 * @example 60 in taped level on rise 3, going 4 in proportion (cos θ 0.8): 75 in along the cable
 */
export function bayPath(
  { bay, readings, angle }: { bay: Bay; readings: GapReadings; angle: BayAngle },
  height: number,
  { readAt, rules }: { readAt: Guard['readAt']; rules: HouseRules },
): BayPath | undefined {
  const clear = clearLength(readings, height, readAt)
  if (!clear) return undefined
  const tapedLevel = bay.kind === 'stair' && bay.taped === 'level'
  const factor = tapedLevel ? 1 / Math.cos(angle.angle) : 1
  return {
    kind: 'bay',
    bay,
    readings,
    clear: clear.value,
    count: clear.count,
    angle,
    factor,
    value: clear.value * factor,
    readingLimit: (rules.readingLimit / Math.sqrt(clear.count)) * factor,
    tapeLimit: tapeLimit(clear.value, rules.tapeClass) * factor,
    angleLimit: tapedLevel ? clear.value * Math.tan(angle.angle) * factor * angle.limit : 0,
  }
}
