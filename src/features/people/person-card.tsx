import { useState } from 'react'
import type { Person } from '@shared/schemas/person'
import { Button } from '@/components/button'
import { Sheet } from '@/components/sheet'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { messageOf } from '@/lib/api-error'
import { useChangePerson, useRenewInvitation } from './api/save-person'
import { OneTimeLink } from './one-time-link'
import { RoleChecks } from './role-checks'

const states: Record<Person['state'], string> = {
  active: '',
  invited: 'has not used the link yet',
  disabled: 'disabled, cannot sign in',
}

/** One person, and what an owner may do with them. */
export function PersonCard({
  person,
  mayManage,
  isSelf,
}: {
  person: Person
  mayManage: boolean
  isSelf: boolean
}) {
  const [editing, setEditing] = useState(false)
  const change = useChangePerson()
  const renew = useRenewInvitation()
  const setDisabled = (disabled: boolean) =>
    change.mutate(
      { personId: person.id, body: { disabled } },
      {
        onSuccess: () =>
          sayDone(
            disabled ? `${person.name} is disabled and signed out.` : `${person.name} can sign in again.`,
          ),
      },
    )
  const error = change.error ?? renew.error
  return (
    <li className="rounded border border-rule bg-card p-4">
      <div className="flex flex-wrap items-baseline justify-between gap-2">
        <h2 className="text-lg font-semibold">
          {person.name}
          {isSelf ? ' (you)' : ''}
        </h2>
        <p className="text-spruce">{person.roles.join(', ')}</p>
      </div>
      <p className="text-soft">
        {person.email}
        {states[person.state] ? ` · ${states[person.state]}` : ''}
      </p>
      {mayManage ? (
        <div className="mt-3 flex flex-wrap gap-2">
          <Button onClick={() => setEditing(true)} aria-label={`Roles of ${person.name}`}>
            Roles
          </Button>
          {person.state === 'disabled' ? (
            <Button
              busy={change.isPending}
              onClick={() => setDisabled(false)}
              aria-label={`Enable ${person.name}`}
            >
              Enable
            </Button>
          ) : (
            <>
              <Button
                busy={renew.isPending}
                onClick={() => renew.mutate(person.id)}
                aria-label={`New link for ${person.name}`}
              >
                New link
              </Button>
              <Button
                look="danger"
                busy={change.isPending}
                onClick={() => setDisabled(true)}
                aria-label={`Disable ${person.name}`}
              >
                Disable
              </Button>
            </>
          )}
        </div>
      ) : null}
      {error ? (
        <div className="mt-3">
          <ErrorNote message={messageOf(error)} />
        </div>
      ) : null}
      {renew.data ? (
        <div className="mt-3">
          <OneTimeLink name={person.name} link={renew.data.link} expires={renew.data.expires} />
        </div>
      ) : null}
      <Sheet open={editing} onOpenChange={setEditing} title={`Roles of ${person.name}`}>
        <EditRoles person={person} onSaved={() => setEditing(false)} />
      </Sheet>
    </li>
  )
}

function EditRoles({ person, onSaved }: { person: Person; onSaved: () => void }) {
  const [roles, setRoles] = useState(person.roles)
  const change = useChangePerson()
  return (
    <div className="flex flex-col gap-4">
      {change.error ? <ErrorNote message={messageOf(change.error)} /> : null}
      <RoleChecks value={roles} onChange={setRoles} />
      <Button
        look="primary"
        busy={change.isPending}
        disabled={roles.length === 0}
        onClick={() => change.mutate({ personId: person.id, body: { roles } }, { onSuccess: onSaved })}
      >
        Save roles
      </Button>
    </div>
  )
}
