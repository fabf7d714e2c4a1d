import { useState } from 'react'
import { parseLength } from '@shared/units/parse-length'
import type { Length as LengthValue } from '@shared/units/length'
import { type LengthFormat, writeLength } from '@shared/units/format-length'
import { controlClasses, Field } from './field'
import { Length } from './length'

interface LengthFieldProps {
  label: string
  value: LengthValue | undefined
  /** Undefined when the field is emptied. Not called while what is written is no length. */
  onChange: (value: LengthValue | undefined) => void
  format: LengthFormat
  hint?: string
  error?: string | undefined
  disabled?: boolean
  required?: boolean
  /** Why a length that was understood cannot be taken over; it stays in the field then. */
  refuse?: (value: LengthValue) => string | undefined
}

const written = (value: LengthValue | undefined, format: LengthFormat): string =>
  value === undefined ? '' : writeLength(value, format)

/** A length as people write it; says at once what it understood, or did not, and keeps what was written. */
export function LengthField({
  label,
  value,
  onChange,
  format,
  hint,
  error,
  disabled,
  required,
  refuse,
}: LengthFieldProps) {
  const [text, setText] = useState<string | null>(null)
  const house = format.style === 'millimetres' ? 'mm' : 'in'
  const parsed = text === null || text.trim() === '' ? undefined : parseLength(text, { default: house })
  const fault = parsed && (parsed.ok ? refuse?.(parsed.length) : parsed.message)
  const understood =
    parsed?.ok && fault === undefined ? (
      <>
        Understood: <Length value={parsed.length} format={format} />
      </>
    ) : undefined
  const commit = () => {
    if (text === null || fault) return
    if (text.trim() === '') {
      if (required !== true) onChange(undefined)
    } else if (parsed?.ok) onChange(parsed.length)
    setText(null)
  }
  return (
    <Field label={label} hint={understood ?? hint} error={fault ?? error}>
      {(control) => (
        <input
          {...control}
          className={`${controlClasses} figures`}
          inputMode="text"
          autoComplete="off"
          // What a form must not save past: it holds what was typed and is not yet a value.
          data-unread={fault === undefined ? undefined : true}
          disabled={disabled}
          value={text ?? written(value, format)}
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
