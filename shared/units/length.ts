import type { $brand } from 'zod'

/** A length in whole nanometres: 1/64 in is 396 875 nm and 1 mm is 1 000 000 nm, both exactly. */
export type Length = number & $brand<'Length'>

/** 1 in = 25.4 mm exactly (NIST SP 811). */
export const NM_PER_INCH = 25_400_000
export const NM_PER_FOOT = 12 * NM_PER_INCH
export const NM_PER_MILLIMETRE = 1_000_000
export const NM_PER_METRE = 1_000_000_000

/**
 * Rounds nanometres to a whole `Length`, halves up.
 * @throws RangeError when the figure is not finite.
 */
export function nanometres(value: number): Length {
  if (!Number.isFinite(value)) throw new RangeError(`A length must be a finite number, not ${value}.`)
  return (Math.floor(value + 0.5) + 0) as Length
}

/** Inches to a `Length`, rounded to the nearest nanometre. @throws RangeError when not finite. */
export const inches = (value: number): Length => nanometres(value * NM_PER_INCH)

/** Millimetres to a `Length`, rounded to the nearest nanometre. @throws RangeError when not finite. */
export const millimetres = (value: number): Length => nanometres(value * NM_PER_MILLIMETRE)

/** A length, or a calculation's unrounded nanometres, in inches. */
export const toInches = (nm: number): number => nm / NM_PER_INCH

/** A length, or a calculation's unrounded nanometres, in millimetres. */
export const toMillimetres = (nm: number): number => nm / NM_PER_MILLIMETRE
