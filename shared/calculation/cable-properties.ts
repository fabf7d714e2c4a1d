import type { Cable } from '../schemas/hardware'
import { NM_PER_MILLIMETRE } from '../units/length'

type Construction = Cable['construction']

/** Wires of a construction, and how many of them lie side by side across the cable. */
const wires: Record<Construction, { count: number; across: number }> = {
  '7x7': { count: 49, across: 9 },
  '7x19': { count: 133, across: 15 },
  '1x19': { count: 19, across: 5 },
}

/** Starting moduli of stainless cable, N/mm². Remembered from EN 1993-1-11:2006 table 3.1: the maker's figure decides. */
export const startingModulus: Record<Construction, number> = {
  '7x7': 90_000,
  '7x19': 90_000,
  '1x19': 130_000,
}

/** Constructional stretch of a lightly loaded steel-core rope, 0.125 % (rope handbooks). */
export const STARTING_SETTLING_STRETCH = 0.00125

/** Thermal expansion of type 316, per kelvin (EN 10088-1). */
export const THERMAL_EXPANSION_316 = 16.0e-6

/**
 * The metallic area of a cable of equal round wires.
 *
 * Formula: 7x7 `49 · π/4 · (d/9)²`, 7x19 `133 · π/4 · (d/15)²`, 1x19 `19 · π/4 · (d/5)²`.
 * Units: diameter nm, area mm².
 * Source: section 7 of the calculation; geometry of equal round wires.
 *
 * @example 1/8 in 7x7: 4.789 mm²
 */
export function metallicArea({ construction, diameter }: Pick<Cable, 'construction' | 'diameter'>): number {
  const { count, across } = wires[construction]
  const wire = diameter / NM_PER_MILLIMETRE / across
  return (count * Math.PI * wire * wire) / 4
}

/**
 * The axial stiffness of a cable.
 *
 * Formula: `EA = area · E`, E being the starting modulus of the construction unless given.
 * Units: N; E in N/mm².
 * Source: section 7 of the calculation.
 *
 * @example 1/8 in 7x7: 4.789 mm² · 90 000 N/mm² = 431 kN
 */
export const axialStiffness = (
  cable: Pick<Cable, 'construction' | 'diameter'>,
  modulus = startingModulus[cable.construction],
): number => metallicArea(cable) * modulus

/**
 * How much a cable between fixed ends gains or loses in tension as it cools or warms.
 *
 * Formula: `EA · α · ΔT`.
 * Units: N; ΔT in kelvin, positive as it cools.
 * Source: section 7 of the calculation; α of type 316 from EN 10088-1.
 *
 * @example EA 431 kN, 30 K cooler: 207 N more
 */
export const thermalTensionChange = (stiffness: number, cooling: number): number =>
  stiffness * THERMAL_EXPANSION_316 * cooling

/**
 * How far a cable stretches as it is tensioned: elastically, and by its wires settling.
 *
 * Formula: `D · (T / EA + settlingStretch)`.
 * Units: nm; T and EA in one unit of force; settlingStretch a strain.
 * Source: section 6 of the calculation; Hooke's law.
 *
 * @example 94.0895833 in, 150 of 151 000 lbf, 0.00125: 0.2110784 in
 */
export const stretchAtTension = (length: number, strain: number): number => length * strain

/** The strain at tension: `T / EA + settlingStretch`. */
export const strainAtTension = (
  { axialStiffness: stiffness, settlingStretch }: Pick<Cable, 'axialStiffness' | 'settlingStretch'>,
  tension: number,
): number => tension / stiffness + settlingStretch
