import { useState } from 'react'
import { Link } from 'react-router-dom'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { registerCompany } from '@/features/session/api/register-company'
import { EntryPage } from '@/features/session/entry-page'
import { PASSWORD_RULES, PasswordField } from '@/features/session/password-field'
import { useEntry } from '@/features/session/use-entry'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { paths } from '../paths'

const unitChoices = [
  { value: 'in', label: 'Inches, pounds-force' },
  { value: 'mm', label: 'Millimetres, newtons' },
] as const

export function Component() {
  const [length, setLength] = useState<'in' | 'mm'>('in')
  const { form, submit, error, busy } = useEntry(registerCompany(length))
  const of = (path: string) => fieldError(error, path)
  const message = formMessage(error, ['company', 'name', 'email', 'password'])
  return (
    <EntryPage title="Register your company">
      <form ref={form} onSubmit={submit} className="flex flex-col gap-4">
        <TextField
          label="Company"
          name="company"
          autoComplete="organization"
          required
          maxLength={120}
          error={of('company')}
        />
        <ChoiceGroup label="You measure in" choices={unitChoices} value={length} onChange={setLength} />
        <TextField
          label="Your name"
          name="name"
          autoComplete="name"
          required
          maxLength={120}
          error={of('name')}
        />
        <TextField
          label="Your e-mail address"
          name="email"
          type="email"
          autoComplete="username"
          required
          error={of('email')}
        />
        <PasswordField
          label="Password"
          name="password"
          autoComplete="new-password"
          hint={PASSWORD_RULES}
          error={of('password')}
        />
        <p className="text-sm text-soft">You become the company’s owner and can add everybody else.</p>
        {message ? <ErrorNote message={message} /> : null}
        <Button type="submit" look="primary" busy={busy}>
          Register
        </Button>
      </form>
      <p className="mt-4">
        <Link to={paths.signIn} className="inline-block py-3 font-medium text-spruce underline">
          Sign in instead
        </Link>
      </p>
    </EntryPage>
  )
}
