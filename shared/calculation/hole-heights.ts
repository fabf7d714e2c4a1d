import type { Radians } from '../units/angle'

/**
 * Where a cable on a stair enters and leaves a post: the height of each hole's centre.
 *
 * Formula: `h − (w / 2) · tan θ` on the lower-going side, `h + (w / 2) · tan θ` on the other.
 * Units: nm, from the height measured at the post's centre line; θ in radians.
 * Source: section 4 of the calculation.
 *
 * @example h 20 in, w 3.5 in, tan θ 0.75: 18.6875 in below and 21.3125 in above
 */
export function holeHeights(height: number, width: number, theta: Radians): { lower: number; upper: number } {
  const half = (width / 2) * Math.tan(theta)
  return { lower: height - half, upper: height + half }
}
