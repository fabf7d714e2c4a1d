import type { HouseRules } from '../../schemas/house-rules'
import type { Lumber } from '../../schemas/lumber'
import { psi } from '../../units/stress'

/**
 * Section modulus and moment of inertia of a rectangular core.
 *
 * Formula: `S = across · along² / 6`, `I = across · along³ / 12`; along is the size in the direction of the pull.
 * Units: mm, S in mm³ and I in mm⁴.
 * Source: section 9 of the calculation; geometry of a rectangle.
 *
 * @example 3.5 in square: S 7.145833 in³, I 12.505208 in⁴
 */
export const rectangleSection = (along: number, across: number): { modulus: number; inertia: number } => ({
  modulus: (across * along ** 2) / 6,
  inertia: (across * along ** 3) / 12,
})

/** Wet service factor for bending, and the Fb · C_F up to which it is 1 (NDS Supplement, read in a copy). */
const WET_FACTOR = 0.85
const WET_FREE = psi(1150)

export interface Allowable {
  lumber: Lumber
  /** C_M */
  wetFactor: number
  /** Fb · C_F · C_M, N/mm². */
  stress: number
}

/**
 * The bending stress a species and grade may take.
 *
 * Formula: `Fb · C_F · C_M`; C_M is 0.85 where the post stands wet and Fb · C_F is above 1150 psi, else 1. Load duration,
 * repetitive member, incising and all other factors are the engineer's.
 * Units: N/mm².
 * Source: NDS Supplement reference design values and adjustment factors, read in a copy.
 *
 * @example Douglas Fir-Larch No. 2 outdoors: 900 · 1.5 · 0.85 = 1147.5 psi
 */
export function allowableBending(lumber: Lumber, { wetService }: Pick<HouseRules, 'wetService'>): Allowable {
  const sized = lumber.bending * lumber.sizeFactor
  const wetFactor = wetService && sized > WET_FREE * (1 + 1e-12) ? WET_FACTOR : 1
  return { lumber, wetFactor, stress: sized * wetFactor }
}
