import { useState } from 'react'
import type { Person } from '@shared/schemas/person'
import { Button } from '@/components/button'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
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
  const message = formMessage(change.error, ['roles'])
  return (
    <div className="flex flex-col gap-4">
      <RoleChecks value={roles} onChange={setRoles} error={fieldError(change.error, 'roles')} />
      {message ? <ErrorNote message={message} /> : null}
      <Button look="primary" busy={change.isPending} onClick={save}>
        Save roles
      </Button>
    </div>
  )
}
