import { useState } from 'react'
import type { Person } from '@shared/schemas/person'
import { Button } from '@/components/button'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { fieldError, messageOf } from '@/lib/api-error'
import { useChangePerson } from './api/change-person'
import { RoleChecks } from './role-checks'

/** The form of a person's roles. */
export function EditRoles({ person, onSaved }: { person: Person; onSaved: () => void }) {
  const [roles, setRoles] = useState(person.roles)
  const change = useChangePerson(person.id)
  const save = () => {
    const onSuccess = () => {
      sayDone(`The roles of ${person.name} are saved.`)
      onSaved()
    }
    change.mutate({ roles }, { onSuccess })
  }
  return (
    <div className="flex flex-col gap-4">
      <RoleChecks value={roles} onChange={setRoles} error={fieldError(change.error, 'roles')} />
      {change.error ? <ErrorNote message={messageOf(change.error)} /> : null}
      <Button look="primary" busy={change.isPending} onClick={save}>
        Save roles
      </Button>
    </div>
  )
}
