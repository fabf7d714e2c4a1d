/** A cable under tension, free to slide through its posts, pushed sideways at mid-span. */
export interface TautCable {
  /** Between the supports on either side of the push, nm. */
  span: number
  /** T, N. */
  tension: number
  /** EA, N. */
  axialStiffness: number
  /** D: all of the cable that stretches, nm. */
  length: number
}

/**
 * The tension of a taut cable pushed sideways at mid-span.
 *
 * Formula: `T′ = T + EA · 2 (half − a) / D`, a = span / 2, half = √(a² + x²).
 * Units: nm and N; `push` is how far the cable is moved, nm.
 * Source: section 8 of the calculation; standard mechanics of a string.
 *
 * @example span 1000 mm, T 1000 N, EA 500 kN, D 1000 mm, 18.586 mm aside: 1345.3 N
 */
export function tensionPushed({ span, tension, axialStiffness, length }: TautCable, push: number): number {
  const a = span / 2
  // (half − a) written without the difference of near-equal numbers.
  const stretch = (push * push) / (Math.hypot(a, push) + a)
  return tension + (axialStiffness * 2 * stretch) / length
}

/**
 * The force that holds a taut cable pushed sideways at mid-span.
 *
 * Formula: `f(x) = 2 · T′ · x / half`.
 * Units: nm and N.
 * Source: section 8 of the calculation; equilibrium at the point pushed.
 *
 * @example as above: 99.9 N
 */
export const forcePushed = (cable: TautCable, push: number): number =>
  (2 * tensionPushed(cable, push) * push) / Math.hypot(cable.span / 2, push)
