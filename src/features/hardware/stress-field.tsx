import { megapascals, psi, type Stress, toPsi } from '@shared/units/stress'
import { NumberField } from '@/components/number-field'

interface StressFieldProps {
  label: string
  value: Stress
  unit: 'psi' | 'N/mm²'
  onChange: (value: Stress) => void
  error?: string | undefined
}

/** A stress in the unit given; N/mm² to a hundredth, psi to a whole one. */
export const shownStress = (value: number, unit: 'psi' | 'N/mm²'): number =>
  unit === 'psi' ? Number(toPsi(value).toFixed(0)) : Number(value.toFixed(2))

/** A stress or a modulus in the company's unit. */
export const StressField = ({ value, unit, onChange, ...rest }: StressFieldProps) => (
  <NumberField
    {...rest}
    unit={unit}
    min={0.01}
    value={shownStress(value, unit)}
    onChange={(given) => {
      if (given !== undefined && given !== shownStress(value, unit)) {
        onChange(unit === 'psi' ? psi(given) : megapascals(given))
      }
    }}
  />
)
