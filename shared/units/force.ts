import type { $brand } from 'zod'

/** A force in newtons. */
export type Force = number & $brand<'Force'>

/** 1 lbf = 4.4482216152605 N (NIST SP 811). */
export const NEWTONS_PER_POUND_FORCE = 4.4482216152605

/** @throws RangeError when the figure is not finite. */
export function newtons(value: number): Force {
  if (!Number.isFinite(value)) throw new RangeError(`A force must be a finite number, not ${value}.`)
  return value as Force
}

/** Pounds-force to newtons. @throws RangeError when not finite. */
export const poundsForce = (value: number): Force => newtons(value * NEWTONS_PER_POUND_FORCE)

/** Newtons to pounds-force. */
export const toPoundsForce = (force: number): number => force / NEWTONS_PER_POUND_FORCE
