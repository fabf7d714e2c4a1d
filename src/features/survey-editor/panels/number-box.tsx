import { useState } from 'react'
import { TextField } from '@/components/field'

interface NumberBoxProps {
  label: string
  value: number
  bounds: readonly [least: number, most: number]
  /** Only whole numbers. */
  whole?: boolean
  disabled: boolean
  onChange: (value: number) => void
}

/** A small number that is kept when the field is left; one that cannot be kept stays there with the reason. */
export function NumberBox({ label, value, bounds, whole = false, disabled, onChange }: NumberBoxProps) {
  const [fault, setFault] = useState<string>()
  const [least, most] = bounds
  const keep = (given: number) => {
    const fits = given >= least && given <= most && (!whole || Number.isInteger(given))
    setFault(fits ? undefined : `Write a ${whole ? 'whole ' : ''}number from ${least} to ${most}.`)
    if (fits && given !== value) onChange(given)
  }
  return (
    <TextField
      key={value}
      label={label}
      error={fault}
      type="number"
      min={least}
      max={most}
      step={whole ? 1 : 'any'}
      inputMode={least < 0 ? 'text' : 'decimal'}
      defaultValue={value}
      disabled={disabled}
      onBlur={(event) => keep(event.target.valueAsNumber)}
    />
  )
}
