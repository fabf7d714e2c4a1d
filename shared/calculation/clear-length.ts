import type { Guard } from '../schemas/guard'
import type { Reading } from '../schemas/bay'
import { meanOfReadings, type PlaceReadings } from './mean-of-readings'

/** What was read of one gap: at the top, at the bottom, or both. */
export interface GapReadings {
  top?: PlaceReadings
  bottom?: PlaceReadings
}

export const gapReadings = (readings: readonly Reading[]): GapReadings => ({
  top: meanOfReadings(readings, 'top'),
  bottom: meanOfReadings(readings, 'bottom'),
})

export interface ClearLength {
  /** nm, unrounded */
  value: number
  /** n, for the limit `readingLimit / √n` */
  count: number
}

/**
 * The clear length of a gap at the height of a cable.
 *
 * Formula: with both places read, linear between them and beyond them,
 * `bottom + (h − hBottom) / (hTop − hBottom) · (top − bottom)`, and n the smaller of the two counts; with one
 * place read, that value at every height.
 * Units: nm; `height` and `readAt` from the walking surface, on a stair from the nosing line.
 * Source: section 1 of the calculation.
 *
 * @returns undefined when nothing was read
 * @example 46.5 in at 33 in and 46.25 in at 3 in give 46.4645833 in at 28.75 in
 */
export function clearLength(
  { top, bottom }: GapReadings,
  height: number,
  readAt: Guard['readAt'],
): ClearLength | undefined {
  if (!top || !bottom) {
    const only = top ?? bottom
    return only && { value: only.mean, count: only.count }
  }
  const count = Math.min(top.count, bottom.count)
  const rise = readAt.top - readAt.bottom
  // Both places at one height leave nothing to interpolate between.
  if (rise === 0) return { value: (top.mean + bottom.mean) / 2, count }
  const share = (height - readAt.bottom) / rise
  return { value: bottom.mean + share * (top.mean - bottom.mean), count }
}
