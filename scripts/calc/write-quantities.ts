import { type Finding, placeName } from '../../shared/schemas/finding'
import type { Units } from '../../shared/schemas/quantities'
import { toPoundsForce } from '../../shared/units/force'
import { NM_PER_MILLIMETRE, toInches, toMillimetres } from '../../shared/units/length'
import { toPsi } from '../../shared/units/stress'

/** Figures are written to ten decimals: what lies beyond is the noise of floating-point sums. */
const written = (value: number | undefined): number | undefined =>
  value === undefined || !Number.isFinite(value) ? undefined : Number(value.toFixed(10)) + 0

const mapped = (value: number | undefined, to: (value: number) => number) =>
  written(value === undefined ? undefined : to(value))

/** Writes figures in a file's own units; what is unknown is left out. Moments come in N·mm, stresses in N/mm². */
export function quantityWriter({ length, force }: Units) {
  const inLength = length === 'in' ? toInches : toMillimetres
  const inForce = force === 'lbf' ? toPoundsForce : (newtons: number) => newtons
  return {
    length: (nm: number | undefined) => mapped(nm, inLength),
    force: (newtons: number | undefined) => mapped(newtons, inForce),
    moment: (value: number | undefined) =>
      mapped(value, (newtonMillimetres) => inForce(newtonMillimetres) * inLength(NM_PER_MILLIMETRE)),
    stress: (value: number | undefined) => mapped(value, length === 'in' ? toPsi : (stress) => stress),
  }
}

export const writeFindings = (findings: readonly Finding[]) =>
  findings.map(({ level, code, where, text }) => ({ level, code, where: placeName(where), text }))
