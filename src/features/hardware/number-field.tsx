import { useState } from 'react'
import { TextField } from '@/components/field'

interface NumberFieldProps {
  label: string
  value: number | undefined
  /** Undefined when the field is emptied or holds no number. */
  onChange: (value: number | undefined) => void
  hint?: string | undefined
  error?: string | undefined
}

/** A number that may be left empty; while it is typed, what is typed stands, and afterwards the number it means. */
export function NumberField({ value, onChange, ...rest }: NumberFieldProps) {
  const [text, setText] = useState<string | null>(null)
  return (
    <TextField
      type="number"
      step="any"
      inputMode="decimal"
      value={text ?? value ?? ''}
      onChange={(event) => {
        setText(event.target.value)
        onChange(Number.isNaN(event.target.valueAsNumber) ? undefined : event.target.valueAsNumber)
      }}
      onBlur={() => setText(null)}
      {...rest}
    />
  )
}
