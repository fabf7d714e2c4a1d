import { Eye, EyeOff } from 'lucide-react'
import { useState } from 'react'
import { IconButton } from '@/components/button'
import { controlClasses, Field } from '@/components/field'

interface PasswordFieldProps {
  label: string
  name: string
  autoComplete: 'current-password' | 'new-password'
  hint?: string
  error?: string | undefined
}

/** A password that can be looked at. */
export function PasswordField({ label, name, autoComplete, hint, error }: PasswordFieldProps) {
  const [shown, setShown] = useState(false)
  return (
    <Field label={label} hint={hint} error={error}>
      {(control) => (
        <div className="flex gap-1">
          <input
            {...control}
            className={controlClasses}
            name={name}
            type={shown ? 'text' : 'password'}
            autoComplete={autoComplete}
            required
          />
          <IconButton
            label={shown ? 'Hide what is typed' : 'Show what is typed'}
            onClick={() => setShown(!shown)}
          >
            {shown ? <EyeOff aria-hidden="true" /> : <Eye aria-hidden="true" />}
          </IconButton>
        </div>
      )}
    </Field>
  )
}

export const PASSWORD_RULES = '12 to 64 characters, any you like; the commonest passwords are refused.'
