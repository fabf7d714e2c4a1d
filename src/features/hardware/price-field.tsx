import { type Money, moneyFromMain, moneyToMain } from '@shared/units/money'
import { NumberField } from '@/components/number-field'
import { allowed, refusalAt } from '@/lib/refusal'

interface PriceFieldProps {
  label: string
  hint: string
  value: Money | undefined
  error: unknown
  onChange: (value: Money | undefined) => void
}

export const PriceField = ({ value, error, onChange, ...rest }: PriceFieldProps) => (
  <NumberField
    {...rest}
    min={0}
    value={value === undefined ? undefined : moneyToMain(value)}
    error={refusalAt(error, 'price', allowed.price)}
    onChange={(given) => onChange(given === undefined ? undefined : moneyFromMain(given))}
  />
)
