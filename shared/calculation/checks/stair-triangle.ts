import { exceeds } from '../round-to-step'

export interface StairTriangle {
  /** Of the largest sphere that stands in the triangle, nm. */
  sphere: number
  /** Of one step, nm. */
  riser: number
  tread: number
  /** The steps were not measured one by one: the flight was divided, or the rules’ tallest riser taken. */
  assumed: boolean
}

interface Flight {
  /** Of the whole flight or of one step, nm. */
  rise?: number
  going?: number
  /** Radians. */
  theta: number
  /** The tallest riser that the rules allow, nm. */
  tallest: number
}

/**
 * The largest sphere in the triangle of riser, tread and lowest member of a stair guard.
 *
 * Formula: the lowest member's lower edge runs parallel to the nosing line, `gap` above it. With riser r and tread g the
 * triangle has the legs `a = r + gap` and `b = a · g / r`; the sphere is its inscribed circle, `a + b − √(a² + b²)`.
 * Rise and going of a whole flight are divided into the fewest steps whose riser the rules allow; with the angle alone
 * the rules' tallest riser is taken.
 * Units: nm, gap measured vertically; θ in radians.
 * Source: plane geometry (incircle of a right triangle); IRC R312.1.3 exception 1 names the triangle.
 *
 * @example r 7 1/2 in, g 10 in, gap 0: 7.5 + 10 − 12.5 = 5 in
 */
export function stairTriangle({ rise, going, theta, tallest }: Flight, gap: number): StairTriangle {
  const flight = rise !== undefined && going !== undefined ? { rise, going } : undefined
  const steps = flight ? Math.max(1, Math.ceil(flight.rise / tallest - 1e-9)) : 1
  const riser = flight ? flight.rise / steps : tallest
  const tread = flight ? flight.going / steps : tallest / Math.tan(theta)
  const a = riser + gap
  const b = (a * tread) / riser
  const isOneStep = flight !== undefined && !exceeds(flight.rise, tallest)
  return { sphere: a + b - Math.hypot(a, b), riser, tread, assumed: !isOneStep }
}
