/** Loads of one size at several heights above a post's foot. */
export interface PostLoads {
  /** Each, N. */
  force: number
  /** mm */
  heights: readonly number[]
}

/** What is known of a post as a beam. */
export interface PostBeam {
  /** From the foot to where the top rail holds it, mm. */
  height: number
  /** EI, N·mm². */
  stiffness: number
}

/**
 * The greatest moment in a post that stands free.
 *
 * Formula: `T · Σh`.
 * Units: N and mm, the moment in N·mm.
 * Source: section 9 of the calculation; AISC Manual tables, cantilever with a load at any point.
 *
 * @example eleven loads of 200 lbf at 3 … 33 in: 39 600 lbf·in
 */
export const cantileverMoment = ({ force, heights }: PostLoads): number =>
  force * heights.reduce((sum, height) => sum + height, 0)

/**
 * The greatest moment in a post that the top rail holds: a simple beam from its foot to its height.
 *
 * Formula: the moment under a load at a of loads at h over the length L is
 * `T · Σ (a (L − h) / L for h ≥ a, h (L − a) / L for h < a)`; the greatest is under one of the loads.
 * Units: N and mm, the moment in N·mm.
 * Source: section 9 of the calculation; AISC Manual tables, simple beam with a load at any point.
 *
 * @example eleven loads of 200 lbf at 3 … 33 in, 36 in high: 10 800 lbf·in
 */
export function proppedMoment({ force, heights }: PostLoads, length: number): number {
  const momentAt = (a: number) =>
    heights.reduce(
      (sum, h) => sum + force * (h >= a ? (a * (length - h)) / length : (h * (length - a)) / length),
      0,
    )
  return heights.reduce((most, height) => Math.max(most, momentAt(height)), 0)
}

/**
 * How far a post that stands free gives way at x for a load of 1 at a.
 *
 * Formula: the nearer of x and a to the foot being n, the farther f: `n² (3 f − n) / (6 EI)`.
 * Units: mm per N; x and a in mm from the foot.
 * Source: AISC Manual tables, cantilever with a load at any point.
 *
 * @example 200 lbf at 36 in of a 3 1/2 in square post, E 1.4·10⁶ psi: 0.177663 in at the load
 */
export function cantileverDeflection({ stiffness }: PostBeam, x: number, a: number): number {
  const [near, far] = x < a ? [x, a] : [a, x]
  return (near * near * (3 * far - near)) / (6 * stiffness)
}

/**
 * How far a post that the top rail holds gives way at x for a load of 1 at a.
 *
 * Formula: for x ≤ a, b = L − a: `b x (L² − b² − x²) / (6 EI L)`; for x beyond the load, mirrored.
 * Units: mm per N; x and a in mm from the foot.
 * Source: AISC Manual tables, simple beam with a load at any point.
 *
 * @example eleven loads of 200 lbf at 3 … 33 in, L 36 in, 3 1/2 in square, E 1.4·10⁶ psi: 0.0828169 in at mid-height
 */
export function proppedDeflection({ height, stiffness }: PostBeam, x: number, a: number): number {
  if (x > a) return proppedDeflection({ height, stiffness }, height - x, height - a)
  const b = height - a
  return (b * x * (height * height - b * b - x * x)) / (6 * stiffness * height)
}

/** How far a post gives way at x under all its loads, mm. */
export const deflectionAt = (
  x: number,
  { force, heights }: PostLoads,
  unit: (x: number, a: number) => number,
): number => heights.reduce((sum, height) => sum + force * unit(x, height), 0)
