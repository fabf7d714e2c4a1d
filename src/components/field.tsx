import {
  type InputHTMLAttributes,
  type ReactNode,
  type SelectHTMLAttributes,
  type TextareaHTMLAttributes,
  useId,
} from 'react'
import { classes } from './classes'

interface FieldFrame {
  label: string
  /** What is expected, in a few words. */
  hint?: ReactNode
  /** What is wrong and what to do. */
  error?: string | undefined
  className?: string
}

interface FieldControl {
  id: string
  'aria-describedby': string | undefined
  'aria-invalid': boolean
}

/** A label, its control, a hint and an error, tied together for everybody. */
export function Field({
  label,
  hint,
  error,
  className,
  children,
}: FieldFrame & { children: (control: FieldControl) => ReactNode }) {
  const id = useId()
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ')
  return (
    <div className={classes('flex flex-col gap-1', className)}>
      <label htmlFor={id} className="text-sm font-medium text-soft">
        {label}
      </label>
      {children({ id, 'aria-describedby': described || undefined, 'aria-invalid': error !== undefined })}
      {hint ? (
        <p id={`${id}-hint`} className="text-sm text-soft">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} role="alert" className="text-sm font-medium text-stop">
          {error}
        </p>
      ) : null}
    </div>
  )
}

export const controlClasses =
  'min-h-12 w-full rounded border border-steel bg-card px-3 py-2 text-base text-ink placeholder:text-soft ' +
  'aria-invalid:border-stop disabled:opacity-60 [&[readonly]]:bg-paper'

type Frame<Props> = FieldFrame & Omit<Props, 'id' | 'className'>

export function TextField({
  label,
  hint,
  error,
  className,
  ...rest
}: Frame<InputHTMLAttributes<HTMLInputElement>> & { ref?: React.Ref<HTMLInputElement> }) {
  return (
    <Field label={label} hint={hint} error={error} className={className}>
      {(control) => <input {...control} className={controlClasses} {...rest} />}
    </Field>
  )
}

export function TextArea({
  label,
  hint,
  error,
  className,
  ...rest
}: Frame<TextareaHTMLAttributes<HTMLTextAreaElement>> & { ref?: React.Ref<HTMLTextAreaElement> }) {
  return (
    <Field label={label} hint={hint} error={error} className={className}>
      {(control) => <textarea rows={4} {...control} className={controlClasses} {...rest} />}
    </Field>
  )
}

export function SelectField({
  label,
  hint,
  error,
  className,
  children,
  ...rest
}: Frame<SelectHTMLAttributes<HTMLSelectElement>> & { ref?: React.Ref<HTMLSelectElement> }) {
  return (
    <Field label={label} hint={hint} error={error} className={className}>
      {(control) => (
        <select {...control} className={controlClasses} {...rest}>
          {children}
        </select>
      )}
    </Field>
  )
}
