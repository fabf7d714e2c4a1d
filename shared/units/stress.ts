import type { $brand } from 'zod'

/** A stress or a modulus in newtons per square millimetre (MPa). */
export type Stress = number & $brand<'Stress'>

/** 1 psi = 6894.757293168 Pa (NIST SP 811). */
export const MPA_PER_PSI = 6894.757293168e-6

/** @throws RangeError when the figure is not finite. */
export function megapascals(value: number): Stress {
  if (!Number.isFinite(value)) throw new RangeError(`A stress must be a finite number, not ${value}.`)
  return value as Stress
}

/** Pounds-force per square inch to newtons per square millimetre. @throws RangeError when not finite. */
export const psi = (value: number): Stress => megapascals(value * MPA_PER_PSI)

/** Newtons per square millimetre to pounds-force per square inch. */
export const toPsi = (stress: number): number => stress / MPA_PER_PSI
