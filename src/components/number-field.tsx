import { type ReactNode, useState } from 'react'
import { controlClasses, Field } from './field'
import { type NumberLimits, parseNumber } from './parse-number'

interface NumberFieldProps extends NumberLimits {
  label: string
  value: number | undefined
  /** Undefined when the field is emptied. Not called while what is written is no number. */
  onChange: (value: number | undefined) => void
  /** Shown after the field: `lbf`, `%`. */
  unit?: string
  hint?: ReactNode
  error?: string | undefined
  disabled?: boolean
}

/** A number as people type it; what is not understood stays in the field, with what to write instead. */
export function NumberField({
  label,
  value,
  onChange,
  unit,
  hint,
  error,
  disabled,
  min,
  max,
}: NumberFieldProps) {
  const [text, setText] = useState<string | null>(null)
  const parsed = text === null ? undefined : parseNumber(text, { min, max })
  const fault = parsed?.ok === false ? parsed.message : undefined
  const commit = () => {
    if (!parsed?.ok) return
    onChange(parsed.value)
    setText(null)
  }
  return (
    <Field label={unit ? `${label}, ${unit}` : label} hint={hint} error={fault ?? error}>
      {(control) => (
        <input
          {...control}
          className={`${controlClasses} figures`}
          inputMode="decimal"
          autoComplete="off"
          // What a form must not save past: it holds what was typed and is not yet a value.
          data-unread={fault === undefined ? undefined : true}
          disabled={disabled}
          value={text ?? value ?? ''}
          onChange={(event) => setText(event.target.value)}
          onBlur={commit}
          onKeyDown={(event) => {
            if (event.key === 'Enter') commit()
            if (event.key === 'Escape') setText(null)
          }}
        />
      )}
    </Field>
  )
}
