import type { CablePath } from './cable-path'
import { stackLimits } from './stack-limits'

export interface Closure {
  /** Overall less sum, nm. */
  gap: number
  /** nm */
  limit: number
}

/**
 * How well the overall reading of a run closes on its bays and posts.
 *
 * Formula: overall − sum, against the root-sum-square of both totals' limits: each total's independent reading
 * limits, its summed tape limit and its summed angle limit.
 * Units: nm.
 * Source: section 3 of the calculation.
 *
 * @example overall 94.5 in, sum 94.125 in, reading limit 1/16 in and no tape class: gap 3/8 in, limit
 * √(1 + 3)/16 = 1/8 in
 */
export function closure(overall: CablePath, summed: CablePath): Closure {
  const limits = [overall, summed].flatMap((path) => [...path.readingLimits, path.tapeLimit, path.angleLimit])
  return { gap: overall.length - summed.length, limit: stackLimits(limits, 'rss') }
}
