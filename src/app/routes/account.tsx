import { useMutation } from '@tanstack/react-query'
import type { FormEvent } from 'react'
import { accounts } from '@shared/endpoints/accounts'
import { roleMeanings } from '@shared/permissions/roles'
import { Button } from '@/components/button'
import { Card, Page } from '@/components/page'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { PASSWORD_RULES, PasswordField } from '@/features/session/password-field'
import { useSession } from '@/features/session/session'
import { call } from '@/lib/api-client'
import { fieldError, messageOf } from '@/lib/api-error'

export function Component() {
  const { person, company } = useSession()
  return (
    <Page title="Account" width="narrow">
      <div className="flex flex-col gap-4">
        <Card title={person.name}>
          <p className="text-soft">
            {person.email}, at {company.name}
          </p>
          <ul className="mt-3 flex flex-col gap-2">
            {person.roles.map((role) => (
              <li key={role}>
                <strong>{role}</strong>: {roleMeanings[role]}
              </li>
            ))}
          </ul>
        </Card>
        <PasswordCard />
      </div>
    </Page>
  )
}

function PasswordCard() {
  const change = useMutation({
    mutationFn: (body: { current: string; next: string }) => call(accounts.changePassword, { body }),
  })
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const target = event.currentTarget
    const fields = Object.fromEntries(new FormData(target)) as Record<string, string>
    change.mutate(
      { current: fields['current'] ?? '', next: fields['next'] ?? '' },
      {
        onSuccess: () => {
          target.reset()
          sayDone('Your password is changed. Other devices are signed out.')
        },
      },
    )
  }
  return (
    <Card title="Change your password">
      <form onSubmit={submit} className="flex flex-col gap-4">
        {change.error ? <ErrorNote message={messageOf(change.error)} /> : null}
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
        <Button type="submit" look="primary" busy={change.isPending}>
          Change it
        </Button>
      </form>
    </Card>
  )
}
