import { type Force, newtons, poundsForce, toPoundsForce } from '@shared/units/force'
import { NumberField } from './number-field'

interface ForceFieldProps {
  label: string
  value: Force | undefined
  unit: 'lbf' | 'N'
  onChange: (value: Force | undefined) => void
  hint?: string | undefined
  error?: string | undefined
}

/** A force in the company's unit. */
export function ForceField({ value, unit, onChange, label, ...rest }: ForceFieldProps) {
  const shown =
    value === undefined ? undefined : Number((unit === 'lbf' ? toPoundsForce(value) : value).toFixed(2))
  return (
    <NumberField
      label={`${label}, ${unit}`}
      value={shown}
      onChange={(given) =>
        onChange(given === undefined ? undefined : unit === 'lbf' ? poundsForce(given) : newtons(given))
      }
      {...rest}
    />
  )
}
