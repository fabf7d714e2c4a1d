import { Link } from 'react-router-dom'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { EntryPage } from '@/features/session/entry-page'
import { PasswordField } from '@/features/session/password-field'
import { signInAddresses } from '@/features/session/sign-in-addresses'
import { useEntry } from '@/features/session/use-entry'
import { call } from '@/lib/api-client'
import { fieldError, messageOf } from '@/lib/api-error'
import { paths } from '../paths'

export function Component() {
  const { submit, error, busy } = useEntry(({ email = '', password = '' }) =>
    call(signInAddresses.signIn, { body: { email, password } }),
  )
  return (
    <EntryPage title="Sign in">
      <form onSubmit={submit} className="flex flex-col gap-4">
        {error ? <ErrorNote message={messageOf(error)} /> : null}
        <TextField
          label="E-mail address"
          name="email"
          type="email"
          autoComplete="username"
          required
          error={fieldError(error, 'email')}
        />
        <PasswordField
          label="Password"
          name="password"
          autoComplete="current-password"
          error={fieldError(error, 'password')}
        />
        <Button type="submit" look="primary" busy={busy}>
          Sign in
        </Button>
      </form>
      <p className="mt-6 text-soft">
        New here?{' '}
        <Link to={paths.register} className="inline-block py-3 font-medium text-spruce underline">
          Register your company
        </Link>
      </p>
    </EntryPage>
  )
}
