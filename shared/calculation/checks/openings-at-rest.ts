import type { Opening } from '../guard-opening'

/** The clear openings of a bay with its cables at rest, square to the cables; nm. */
export interface OpeningsAtRest {
  /** The widest between neighbouring cables, centre to centre; undefined for a single cable. */
  pitch?: number
  /** The widest clear opening between cables; undefined for a single cable. */
  between?: number
  /** Of the widest pair, the lower cable, from 1. */
  above?: number
  /** From the lower edge of the opening to the lowest cable. */
  bottom: number
  /** From the highest cable to the rail. */
  top: number
  /** Of the highest cable's centre, above the walking surface or nosing line. */
  highest: number
}

/**
 * The clear openings of a bay at rest.
 *
 * Formula: between cables `pitch · cos θ − d`, pitch being the widest vertical one of the run; at the bottom
 * `(h₁ − d / 2 − z0) · cos θ`, at the top `(z1 − hₙ − d / 2) · cos θ`.
 * Units: nm; θ in radians.
 * Source: section 8 of the calculation.
 *
 * @returns undefined when there is no cable
 * @example cables every 3 in, 5/32 in thick, on the level: 2 27/32 in clear
 */
export function openingsAtRest(
  heights: readonly number[],
  { bottom, top }: Opening,
  { diameter, theta }: { diameter: number; theta: number },
): OpeningsAtRest | undefined {
  const [lowest, highest] = [heights[0], heights.at(-1)]
  if (lowest === undefined || highest === undefined) return undefined
  const square = Math.cos(theta)
  const openings: OpeningsAtRest = {
    bottom: (lowest - diameter / 2 - bottom) * square,
    top: (top - highest - diameter / 2) * square,
    highest,
  }
  for (const [i, height] of heights.entries()) {
    const before = heights[i - 1]
    if (before === undefined) continue
    const pitch = (height - before) * square
    if (openings.pitch !== undefined && pitch <= openings.pitch) continue
    Object.assign(openings, { pitch, between: pitch - diameter, above: i })
  }
  return openings
}
