import { useQuery } from '@tanstack/react-query'
import { Link, useParams } from 'react-router-dom'
import { Button } from '@/components/button'
import { ErrorNote, Loading } from '@/components/states'
import { acceptInvitation } from '@/features/session/api/accept-invitation'
import { invitationQuery } from '@/features/session/api/read-invitation'
import { EntryPage } from '@/features/session/entry-page'
import { PASSWORD_RULES, PasswordField } from '@/features/session/password-field'
import { useEntry } from '@/features/session/use-entry'
import { fieldError, messageOf } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { paths } from '../paths'

/** A one-time link: whom it is for, and the password they choose. */
export function Component() {
  const { token = '' } = useParams()
  const invitation = useQuery(invitationQuery(token))
  const { form, submit, error, busy } = useEntry(acceptInvitation(token))
  if (invitation.isPending) return <Loading what="the invitation" />
  if (invitation.error) {
    return (
      <EntryPage title="One-time link">
        <ErrorNote message={messageOf(invitation.error)} onRetry={() => void invitation.refetch()} />
        <p className="mt-4 text-soft">
          If you have a password already,{' '}
          <Link to={paths.signIn} className="inline-block py-3 font-medium text-spruce underline">
            sign in
          </Link>
          .
        </p>
      </EntryPage>
    )
  }
  const { company, name, email } = invitation.data
  const message = formMessage(error, ['password'])
  return (
    <EntryPage title={`Welcome, ${name}`}>
      <p className="mb-4">
        {company} has made you an account. You sign in as <strong>{email}</strong>; choose your password.
      </p>
      <form ref={form} onSubmit={submit} className="flex flex-col gap-4">
        {/* For the browser's password keeper, which wants to know whose password this is. */}
        <input hidden readOnly autoComplete="username" value={email} />
        <PasswordField
          label="Password"
          name="password"
          autoComplete="new-password"
          hint={PASSWORD_RULES}
          error={fieldError(error, 'password')}
        />
        {message ? <ErrorNote message={message} /> : null}
        <Button type="submit" look="primary" busy={busy}>
          Set password and sign in
        </Button>
      </form>
    </EntryPage>
  )
}
