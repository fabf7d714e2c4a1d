import type { CableLayout } from '../schemas/run'
import type { Radians } from '../units/angle'
import type { Opening } from './guard-opening'
import { countPitches, roundToStep } from './round-to-step'

export interface CableHeights {
  /** From the lowest up, nm: whole hole steps, or as they were given. */
  heights: number[]
  /** Unrounded, nm. */
  exact: number[]
  /** p, the largest vertical pitch allowed, nm; undefined for explicit heights. */
  pitch?: number
}

/** More than this many cables in one run is a slip: a spacing of a few nanometres. */
const MOST_CABLES = 1000

/**
 * The heights of the cables of a run.
 *
 * Formula: p = spacing / cos θmin, n = ⌈(z1 − z0) / p⌉ − 1. `even`: n + 1 equal openings. `fixed`: p down from z1, the
 * remainder at the bottom. Each rounded to the nearest `holeStep`, halves up. Explicit heights win, as they are.
 * Units: nm from the walking surface, on a stair from the nosing line; θmin, the flattest bay's, in radians.
 * Source: section 4 of the calculation.
 *
 * @example even, 3 in under 34.5 in: n = ⌈11.5⌉ − 1 = 11, at 2.875, 5.75 … 31.625 in
 */
export function cableHeights(
  layout: CableLayout,
  { bottom, top }: Opening,
  { flattest, holeStep }: { flattest: Radians; holeStep: number },
): CableHeights {
  if ('heights' in layout) {
    const given = [...layout.heights].sort((a, b) => a - b)
    return { heights: given, exact: given }
  }
  const pitch = layout.spacing / Math.cos(flattest)
  const openings = countPitches(top - bottom, pitch)
  if (!(openings > 1) || openings > MOST_CABLES) return { heights: [], exact: [], pitch }
  const exact = Array.from({ length: openings - 1 }, (_, i) =>
    layout.layout === 'even'
      ? bottom + ((i + 1) * (top - bottom)) / openings
      : top - (openings - 1 - i) * pitch,
  )
  return { heights: exact.map((height) => roundToStep(height, holeStep)), exact, pitch }
}
