import { useQuery } from '@tanstack/react-query'
import { useParams } from 'react-router-dom'
import { Button } from '@/components/button'
import { ErrorNote, Loading } from '@/components/states'
import { EntryPage } from '@/features/session/entry-page'
import { PASSWORD_RULES, PasswordField } from '@/features/session/password-field'
import { signInAddresses } from '@/features/session/sign-in-addresses'
import { useEntry } from '@/features/session/use-entry'
import { call } from '@/lib/api-client'
import { fieldError, messageOf } from '@/lib/api-error'

/** A one-time link: whom it is for, and the password they choose. */
export function Component() {
  const { token = '' } = useParams()
  const invitation = useQuery({
    queryKey: ['invitation', token],
    queryFn: ({ signal }) => call(signInAddresses.readInvitation, { params: { token }, signal }),
    staleTime: Infinity,
  })
  const { submit, error, busy } = useEntry(({ password = '' }) =>
    call(signInAddresses.acceptInvitation, { params: { token }, body: { password } }),
  )
  if (invitation.isPending) return <Loading what="the invitation" />
  if (invitation.error) {
    return (
      <EntryPage title="One-time link">
        <ErrorNote message={messageOf(invitation.error)} />
      </EntryPage>
    )
  }
  const { company, name, email } = invitation.data
  return (
    <EntryPage title={`Welcome, ${name}`}>
      <p className="mb-4">
        {company} has made you an account. You sign in as <strong>{email}</strong>; choose your password.
      </p>
      <form onSubmit={submit} className="flex flex-col gap-4">
        {error ? <ErrorNote message={messageOf(error)} /> : null}
        <input type="hidden" autoComplete="username" value={email} readOnly />
        <PasswordField
          label="Password"
          name="password"
          autoComplete="new-password"
          hint={PASSWORD_RULES}
          error={fieldError(error, 'password')}
        />
        <Button type="submit" look="primary" busy={busy}>
          Set password and sign in
        </Button>
      </form>
    </EntryPage>
  )
}
