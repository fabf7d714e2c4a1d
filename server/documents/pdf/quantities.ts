import type { Units } from '@shared/schemas/quantities'
import { writeForce } from '@shared/units/format-force'
import { writeLength } from '@shared/units/format-length'
import { toPoundsForce } from '@shared/units/force'
import { toPsi } from '@shared/units/stress'
import { writable } from './page'

/** Writes figures for print in a survey's units: lengths to 1/32 in or 0.1 mm, what is unknown as a dash. */
export function printed({ length, force }: Units) {
  const known = (value: number | undefined, write: (value: number) => string) =>
    value === undefined ? '–' : write(value)
  const lengthFormat = length === 'in' ? { style: 'inches', finest: 32 } : { style: 'millimetres' }
  return {
    length: (nm: number | undefined) =>
      known(nm, (value) => writable(writeLength(value, lengthFormat as Parameters<typeof writeLength>[1]))),
    force: (newtons: number | undefined) => known(newtons, (value) => writeForce(value, force)),
    /** Small forces with one decimal. */
    push: (newtons: number | undefined) =>
      known(newtons, (value) =>
        force === 'lbf' ? `${toPoundsForce(value).toFixed(1)} lbf` : `${value.toFixed(0)} N`,
      ),
    stress: (value: number | undefined) =>
      known(value, (stress) =>
        length === 'in' ? `${toPsi(stress).toFixed(0)} psi` : `${stress.toFixed(2)} N/mm²`,
      ),
    /** From N·mm. */
    moment: (value: number | undefined) =>
      known(value, (moment) =>
        force === 'lbf'
          ? `${(toPoundsForce(moment) / 25.4).toFixed(0)} lbf·in`
          : `${(moment / 1000).toFixed(0)} N·m`,
      ),
    share: (part: number | undefined, whole: number | undefined) =>
      part === undefined || whole === undefined ? '–' : `${((part / whole) * 100).toFixed(0)} %`,
  }
}

export type Printed = ReturnType<typeof printed>
