import { roleMeanings } from '@shared/permissions/roles'
import { Button } from '@/components/button'
import { Card, Page } from '@/components/page'
import { ErrorNote } from '@/components/states'
import { useSignOut } from '@/features/session/api/sign-out'
import { PasswordChange } from '@/features/session/password-change'
import { useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'

export function Component() {
  const { person, company } = useSession()
  const signOut = useSignOut()
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
                <strong className="font-semibold">{role}</strong>: {roleMeanings[role]}
              </li>
            ))}
          </ul>
        </Card>
        <PasswordChange email={person.email} />
        {signOut.error ? <ErrorNote message={messageOf(signOut.error)} /> : null}
        <Button busy={signOut.isPending} onClick={() => signOut.mutate()} className="sm:self-start">
          Sign out
        </Button>
      </div>
    </Page>
  )
}
