import type { Guard } from '../schemas/guard'
import { inches } from '../units/length'

/** A cap of nominal 2 in lumber, dressed (PS 20). */
const RAIL_DEPTH = inches(1.5)

export interface Opening {
  /** z0, nm above the walking surface or nosing line. */
  bottom: number
  /** z1, nm, the underside of the top rail. */
  top: number
}

/**
 * The opening that the cables of a run fill.
 *
 * Formula: from `bottom` to `topRailUnderside`, which left out is the guard's height less 1 1/2 in. A run of stair
 * bays only takes what `guard.stair` gives, and the guard's own figures for the rest.
 * Units: nm.
 * Source: section 4 of the calculation.
 *
 * @example height 36 in and no rail underside: 0 to 34.5 in; with stair height 34 in: 0 to 32.5 in on stairs
 */
export function guardOpening(guard: Guard, stairsOnly: boolean): Opening {
  const stair = stairsOnly ? guard.stair : undefined
  // A stair height of its own also moves its rail: the level rail's underside would lie above it.
  const stairTop = stair?.topRailUnderside ?? (stair?.height && stair.height - RAIL_DEPTH)
  return {
    bottom: stair?.bottom ?? guard.bottom,
    // A guard lower than its own rail is no guard: the opening is nothing, not less.
    top: Math.max(0, stairTop ?? guard.topRailUnderside ?? guard.height - RAIL_DEPTH),
  }
}
