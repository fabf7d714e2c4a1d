import { type Force, newtons, poundsForce, toPoundsForce } from '@shared/units/force'
import { NumberField } from './number-field'

interface ForceFieldProps {
  label: string
  value: Force | undefined
  unit: 'lbf' | 'N'
  onChange: (value: Force | undefined) => void
  hint?: string
  error?: string | undefined
  disabled?: boolean
}

/** What is written as less is nothing. */
const LEAST = 0.01

/** A force in the company's unit. */
export function ForceField({ value, unit, onChange, ...rest }: ForceFieldProps) {
  const shown =
    value === undefined ? undefined : Number((unit === 'lbf' ? toPoundsForce(value) : value).toFixed(2))
  const read = (given: number): Force => (unit === 'lbf' ? poundsForce(given) : newtons(given))
  return (
    <NumberField
      {...rest}
      unit={unit}
      min={LEAST}
      value={shown}
      // The figure shown again is the force as it is, not as it was rounded for showing.
      onChange={(given) => {
        if (given !== shown) onChange(given === undefined ? undefined : read(given))
      }}
    />
  )
}
