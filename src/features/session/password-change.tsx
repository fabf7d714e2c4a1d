import { type FormEvent, useId } from 'react'
import { Button } from '@/components/button'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { useFirstFault } from '@/components/use-first-fault'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { useChangePassword } from './api/change-password'
import { PASSWORD_RULES, PasswordField } from './password-field'

/** The form that changes the own password. */
export function PasswordChange({ email }: { email: string }) {
  const change = useChangePassword()
  const form = useFirstFault(change.error)
  const heading = useId()
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const target = event.currentTarget
    const fields = Object.fromEntries(new FormData(target)) as Record<string, string>
    const onSuccess = () => {
      target.reset()
      sayDone('Your password is changed. Your other devices are signed out.')
    }
    change.mutate({ current: fields['current'] ?? '', next: fields['next'] ?? '' }, { onSuccess })
  }
  const message = formMessage(change.error, ['current', 'next'])
  return (
    <section className="rounded border border-rule bg-card p-4" aria-labelledby={heading}>
      <h2 id={heading} className="mb-3 text-lg font-semibold">
        Change your password
      </h2>
      <form ref={form} onSubmit={submit} className="flex flex-col gap-4">
        {/* For the browser's password keeper, which wants to know whose password this is. */}
        <input hidden readOnly autoComplete="username" value={email} />
        <PasswordField
          label="Present password"
          name="current"
          autoComplete="current-password"
          error={fieldError(change.error, 'current')}
        />
        <PasswordField
          label="New password"
          name="next"
          autoComplete="new-password"
          hint={PASSWORD_RULES}
          error={fieldError(change.error, 'next')}
        />
        {message ? <ErrorNote message={message} /> : null}
        <Button type="submit" look="primary" busy={change.isPending} className="sm:self-start">
          Change password
        </Button>
      </form>
    </section>
  )
}
