import { axialStiffness } from '@shared/calculation/cable-properties'
import type { Cable } from '@shared/schemas/hardware'
import { type Force, newtons, poundsForce, toPoundsForce } from '@shared/units/force'

/**
 * The axial stiffness to offer for a cable, to three figures of the company's unit: the modulus it comes from is known
 * no better.
 */
export function offeredStiffness(cable: Pick<Cable, 'construction' | 'diameter'>, unit: 'lbf' | 'N'): Force {
  const exact = axialStiffness(cable)
  const figures = (value: number) => Number(value.toPrecision(3))
  return unit === 'lbf' ? poundsForce(figures(toPoundsForce(exact))) : newtons(figures(exact))
}
