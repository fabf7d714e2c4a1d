import { Link } from 'react-router-dom'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { signIn } from '@/features/session/api/sign-in'
import { EntryPage } from '@/features/session/entry-page'
import { PasswordField } from '@/features/session/password-field'
import { useEntry } from '@/features/session/use-entry'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { paths } from '../paths'

export function Component() {
  const { form, submit, error, busy } = useEntry(signIn)
  const message = formMessage(error, ['email', 'password'])
  return (
    <EntryPage title="Sign in">
      <form ref={form} onSubmit={submit} className="flex flex-col gap-4">
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
        {message ? <ErrorNote message={message} /> : null}
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
