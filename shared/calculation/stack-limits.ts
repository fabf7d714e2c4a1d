import type { HouseRules } from '../schemas/house-rules'
import type { CablePath } from './cable-path'

/**
 * Stacks limits of error into one.
 *
 * Formula: `rss`: the root of the sum of the squares; `worst`: the plain sum.
 * Units: nm.
 * Source: section 6 of the calculation; usual tolerance stacking.
 *
 * @example 3, 4 and 12: 13 by rss, 19 by worst
 */
export function stackLimits(limits: readonly number[], stacking: HouseRules['stacking']): number {
  let sum = 0
  for (const limit of limits) sum += stacking === 'rss' ? limit * limit : limit
  return stacking === 'rss' ? Math.sqrt(sum) : sum
}

/** The limits that remain when nothing was measured: one cut and two seated ends. */
export const benchLimits = ({
  cutLimit,
  seatLimit,
}: Pick<HouseRules, 'cutLimit' | 'seatLimit'>): number[] => [cutLimit, seatLimit, seatLimit]

export interface Slop {
  /** U: everything stacked, nm. */
  u: number
  /** Us: cutting and seating alone, nm. */
  us: number
}

/** U and Us of a path. Independent reading limits, the summed tape and angle limits, one cut and two seats. */
export function slop(path: CablePath, rules: HouseRules): Slop {
  const bench = benchLimits(rules)
  const measured = [...path.readingLimits, path.tapeLimit, path.angleLimit]
  return {
    u: stackLimits([...measured, ...bench], rules.stacking),
    us: stackLimits(bench, rules.stacking),
  }
}
