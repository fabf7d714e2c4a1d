import type { Reading, ReadingPlace } from '../schemas/bay'

/** Readings at one place: their mean, how many, and the least and greatest; nm. */
export interface PlaceReadings {
  mean: number
  count: number
  least: number
  greatest: number
}

/**
 * The mean of the readings taken at one place. Struck readings do not count.
 *
 * Formula: mean = Σ value / n. Its limit is `readingLimit / √n` (see `cable-path`).
 * Units: nm, unrounded.
 * Source: section 1 of the calculation; the limit of a mean of independent readings.
 *
 * @returns undefined when no reading at the place counts
 * @example 46 1/2 in and 46 5/8 in at the top, and a struck 64 in: mean 46.5625 in, n = 2
 */
export function meanOfReadings(readings: readonly Reading[], place: ReadingPlace): PlaceReadings | undefined {
  let sum = 0
  let count = 0
  let least = Infinity
  let greatest = -Infinity
  for (const { at, value, struck } of readings) {
    if (at !== place || struck !== undefined) continue
    sum += value
    count += 1
    least = Math.min(least, value)
    greatest = Math.max(greatest, value)
  }
  return count === 0 ? undefined : { mean: sum / count, count, least, greatest }
}
