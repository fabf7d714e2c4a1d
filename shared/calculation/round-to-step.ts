/**
 * Rounding to a step, once, where the calculation says so. A figure is first taken to the thousandth of a
 * nanometre, so that the noise of floating-point sums can neither add a step nor take one away.
 */

const PARTS_PER_NANOMETRE = 1000

/** Removes floating-point noise: nm to the nearest thousandth of a nanometre. */
export const withoutNoise = (nm: number): number =>
  Math.round(nm * PARTS_PER_NANOMETRE) / PARTS_PER_NANOMETRE + 0

/** Whether a is greater than b by more than floating-point noise; both in nm. */
export const exceeds = (a: number, b: number): boolean => a - b > 1 / PARTS_PER_NANOMETRE

/**
 * Rounds up to a whole number of steps.
 *
 * @param nm the length, nm; @param step the step, nm, above zero
 * @example 48 in with a step of 1/16 in is 48 in; 48.0001 in is 48 1/16 in
 */
export const roundUpToStep = (nm: number, step: number): number => Math.ceil(withoutNoise(nm) / step) * step

/**
 * Rounds to the nearest whole number of steps, halves up.
 *
 * @param nm the length, nm; @param step the step, nm, above zero
 * @example 1 1/32 in with a step of 1/16 in is 1 1/16 in
 */
export const roundToStep = (nm: number, step: number): number =>
  Math.floor((withoutNoise(nm) + step / 2) / step) * step

/** How many pitches fill a length, rounded up: 36 in of 3 in is 12. Both in nm. */
export const countPitches = (nm: number, pitch: number): number => {
  const exact = nm / pitch
  const nearest = Math.round(exact)
  return Math.abs(exact - nearest) * pitch <= 1 / PARTS_PER_NANOMETRE ? nearest : Math.ceil(exact)
}
