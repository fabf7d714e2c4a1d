import type { InputHTMLAttributes, ReactNode } from 'react'
import { useId } from 'react'
import { classes } from './classes'

export interface Choice<Value extends string> {
  value: Value
  label: ReactNode
}

interface ChoiceGroupProps<Value extends string> {
  label: string
  choices: readonly Choice<Value>[]
  value: Value | undefined
  onChange: (value: Value) => void
  disabled?: boolean
  hint?: ReactNode
  /** The label is spoken but not shown, where what is shown beside says it. */
  quiet?: boolean
}

/** A few choices side by side, one of them taken: radio buttons that look like one control. */
export function ChoiceGroup<Value extends string>({
  label,
  choices,
  value,
  onChange,
  disabled,
  hint,
  quiet = false,
}: ChoiceGroupProps<Value>) {
  const name = useId()
  return (
    <fieldset disabled={disabled} className="min-w-0">
      <legend className={quiet ? 'sr-only' : 'mb-1 text-sm font-medium text-soft'}>{label}</legend>
      <div className="flex flex-wrap gap-1">
        {choices.map((choice) => (
          <label
            key={choice.value}
            className={classes(
              'inline-flex min-h-12 items-center rounded border px-3 text-base',
              'has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-chalk',
              'has-checked:border-chalk has-checked:bg-chalk-ground has-checked:font-medium has-disabled:opacity-60',
              'border-steel bg-card',
            )}
          >
            <input
              type="radio"
              className="sr-only"
              name={name}
              value={choice.value}
              checked={choice.value === value}
              onChange={() => onChange(choice.value)}
            />
            {choice.label}
          </label>
        ))}
      </div>
      {hint ? <p className="mt-1 text-sm text-soft">{hint}</p> : null}
    </fieldset>
  )
}

interface CheckboxProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'type' | 'className'> {
  label: ReactNode
  hint?: ReactNode
  ref?: React.Ref<HTMLInputElement>
}

export function Checkbox({ label, hint, ...rest }: CheckboxProps) {
  const id = useId()
  return (
    <label className="flex min-h-12 items-start gap-3 py-2">
      <input
        type="checkbox"
        className="mt-0.5 size-6 shrink-0 accent-spruce"
        aria-describedby={hint ? id : undefined}
        {...rest}
      />
      <span>
        <span className="text-base">{label}</span>
        {hint ? (
          <span id={id} className="block text-sm text-soft">
            {hint}
          </span>
        ) : null}
      </span>
    </label>
  )
}

interface CheckboxGroupProps {
  label: string
  hint?: ReactNode
  error?: string | undefined
  /** Checkboxes. */
  children: ReactNode
}

/** Several checkboxes under one question. */
export function CheckboxGroup({ label, hint, error, children }: CheckboxGroupProps) {
  const id = useId()
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ')
  return (
    <fieldset className="min-w-0" aria-describedby={described || undefined}>
      <legend className="text-sm font-medium text-soft">{label}</legend>
      {hint ? (
        <p id={`${id}-hint`} className="text-sm text-soft">
          {hint}
        </p>
      ) : null}
      {children}
      {error ? (
        <p id={`${id}-error`} role="alert" className="text-sm font-medium text-stop">
          {error}
        </p>
      ) : null}
    </fieldset>
  )
}
