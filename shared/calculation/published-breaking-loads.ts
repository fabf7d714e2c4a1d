import type { Cable } from '../schemas/hardware'
import { poundsForce } from '../units/force'
import { inches } from '../units/length'

/**
 * Breaking strength of corrosion-resistant wire rope, MIL-W-83420 as in FAA AC 43.13-1B, table 7-3: diameter in inches,
 * lbf. That wire is type 302 or 304; type 316 is weaker, and the maker's certificate decides.
 */
const table: readonly { construction: Cable['construction']; diameter: number; load: number }[] = [
  { construction: '7x7', diameter: 3 / 32, load: 920 },
  { construction: '7x19', diameter: 1 / 8, load: 1760 },
  { construction: '7x19', diameter: 5 / 32, load: 2400 },
  { construction: '7x19', diameter: 3 / 16, load: 3700 },
  { construction: '7x19', diameter: 1 / 4, load: 6400 },
]

/** The share that is left of it for type 316, a guess to start from. */
const SHARE_316 = 0.8
/** Starting loads are rounded down to this, lbf. */
const STEP = 50

/**
 * The published breaking strength of a wire rope of 302 or 304.
 * Units: diameter nm, N.
 * @returns undefined for one that is not in the table
 * @example 5/32 in 7x19: 2400 lbf
 */
export function publishedBreakingLoad({
  construction,
  diameter,
}: Pick<Cable, 'construction' | 'diameter'>): number | undefined {
  const row = table.find((each) => each.construction === construction && inches(each.diameter) === diameter)
  return row && poundsForce(row.load)
}

/**
 * A breaking load to start from for a cable of type 316, lbf: four fifths of the published strength of 7x19 of that
 * diameter, rounded down to 50.
 * @throws RangeError when the table has no such diameter
 */
export function startingBreakingLoad(diameter: number): number {
  const row = table.find((each) => each.construction === '7x19' && each.diameter === diameter)
  if (!row) throw new RangeError(`No published breaking strength of 7x19 of ${diameter} in.`)
  return Math.floor((row.load * SHARE_316) / STEP) * STEP
}
