import { countPitches } from '../round-to-step'

/**
 * How many spacers a bay needs so that no span is wider than the house allows.
 *
 * Formula: `⌈clear / widest⌉ − 1`.
 * Units: nm.
 * Source: section 8 of the calculation; common practice, no source.
 *
 * @example 100 in clear at 48 in: 2
 */
export const spacersNeeded = (clear: number, widest: number): number =>
  Math.max(0, countPitches(clear, widest) - 1)
