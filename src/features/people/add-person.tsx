import { type FormEvent, useState } from 'react'
import type { Role } from '@shared/schemas/role'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { useFirstFault } from '@/components/use-first-fault'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { useAddPerson } from './api/add-person'
import { OneTimeLink } from './one-time-link'
import { RoleChecks } from './role-checks'

const text = (form: FormData, name: string): string => {
  const value = form.get(name)
  return typeof value === 'string' ? value.trim() : ''
}

/** Adds a person and shows their one-time link. */
export function AddPerson() {
  const [roles, setRoles] = useState<Role[]>([])
  const add = useAddPerson()
  const form = useFirstFault(add.error)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const fields = new FormData(event.currentTarget)
    add.mutate({ name: text(fields, 'name'), email: text(fields, 'email'), roles })
  }
  if (add.data) {
    const { person, link, expires } = add.data
    return <OneTimeLink name={person.name} link={link} expires={expires} />
  }
  const of = (path: string) => fieldError(add.error, path)
  const message = formMessage(add.error, ['name', 'email', 'roles'])
  return (
    <form ref={form} onSubmit={submit} className="flex flex-col gap-4">
      <TextField label="Name" name="name" autoComplete="off" required maxLength={120} error={of('name')} />
      <TextField
        label="E-mail address"
        name="email"
        type="email"
        autoComplete="off"
        required
        error={of('email')}
      />
      <RoleChecks value={roles} onChange={setRoles} error={of('roles')} />
      {message ? <ErrorNote message={message} /> : null}
      <Button type="submit" look="primary" busy={add.isPending}>
        Add and make the link
      </Button>
    </form>
  )
}
