import { useState } from 'react'
import type { Person } from '@shared/schemas/person'
import { Button } from '@/components/button'
import { Sheet } from '@/components/sheet'
import { ErrorNote } from '@/components/states'
import { sayDone, sayProblem } from '@/components/toast'
import { messageOf } from '@/lib/api-error'
import { useChangePerson } from './api/change-person'
import { useRenewInvitation } from './api/renew-invitation'
import { EditRoles } from './edit-roles'
import { OneTimeLink } from './one-time-link'

/** What an owner may do with a person. Nobody shuts themselves out: the own card offers the roles alone. */
export function PersonControls({ person, isSelf }: { person: Person; isSelf: boolean }) {
  const [editing, setEditing] = useState(false)
  const change = useChangePerson(person.id)
  const renew = useRenewInvitation(person.id)
  const { name, state } = person
  const enable = (after: string) =>
    change.mutate(
      { disabled: false },
      { onSuccess: () => sayDone(after), onError: (error) => sayProblem(messageOf(error)) },
    )
  const disable = () => {
    const takeBack = () => enable(`${name} can sign in again.`)
    change.mutate(
      { disabled: true },
      { onSuccess: () => sayDone(`${name} is disabled and signed out.`, takeBack) },
    )
  }
  const error = change.error ?? renew.error
  return (
    <div className="mt-3 flex flex-col gap-3">
      <div className="flex flex-wrap gap-2">
        <Button onClick={() => setEditing(true)} aria-label={`Roles of ${name}`}>
          Roles
        </Button>
        {state === 'disabled' ? (
          <Button
            busy={change.isPending}
            onClick={() => enable(`${name} can sign in again.`)}
            aria-label={`Enable ${name}`}
          >
            Enable
          </Button>
        ) : null}
        {state !== 'disabled' && !isSelf ? (
          <>
            <Button busy={renew.isPending} onClick={() => renew.mutate()} aria-label={`New link for ${name}`}>
              New link
            </Button>
            <Button look="danger" busy={change.isPending} onClick={disable} aria-label={`Disable ${name}`}>
              Disable
            </Button>
          </>
        ) : null}
      </div>
      {error ? <ErrorNote message={messageOf(error)} /> : null}
      {renew.data && state !== 'disabled' ? (
        <OneTimeLink name={name} link={renew.data.link} expires={renew.data.expires} />
      ) : null}
      <Sheet open={editing} onOpenChange={setEditing} title={`Roles of ${name}`}>
        <EditRoles person={person} onSaved={() => setEditing(false)} />
      </Sheet>
    </div>
  )
}
