import type { Units } from '@shared/schemas/quantities'
import { toPoundsForce } from '@shared/units/force'
import { toPsi } from '@shared/units/stress'

/** Writes forces, stresses and moments in a survey's units; what is unknown as words. */
export function figuresIn({ length, force }: Units) {
  const known = (
    value: number | undefined,
    write: (value: number) => string,
    unknown = 'not known',
  ): string => (value === undefined ? unknown : write(value))
  return {
    force: (newtons: number | undefined, unknown?: string) =>
      known(
        newtons,
        (value) => (force === 'lbf' ? `${toPoundsForce(value).toFixed(0)} lbf` : `${value.toFixed(0)} N`),
        unknown,
      ),
    /** With a decimal, for what is small. */
    push: (newtons: number | undefined, unknown?: string) =>
      known(
        newtons,
        (value) => (force === 'lbf' ? `${toPoundsForce(value).toFixed(1)} lbf` : `${value.toFixed(0)} N`),
        unknown,
      ),
    /** N/mm² */
    stress: (stress: number | undefined, unknown?: string) =>
      known(
        stress,
        (value) => (length === 'in' ? `${toPsi(value).toFixed(0)} psi` : `${value.toFixed(2)} N/mm²`),
        unknown,
      ),
    /** N·mm */
    moment: (moment: number | undefined, unknown?: string) =>
      known(
        moment,
        (value) =>
          force === 'lbf'
            ? `${(toPoundsForce(value) / 25.4).toFixed(0)} lbf·in`
            : `${(value / 1000).toFixed(0)} N·m`,
        unknown,
      ),
    share: (part: number | undefined, whole: number | undefined, unknown = 'not in the hardware') =>
      part === undefined || whole === undefined ? unknown : `${((part / whole) * 100).toFixed(0)} %`,
  }
}

export type Figures = ReturnType<typeof figuresIn>
