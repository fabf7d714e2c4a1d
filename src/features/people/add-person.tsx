import { type FormEvent, useState } from 'react'
import type { Role } from '@shared/schemas/role'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { fieldError, messageOf } from '@/lib/api-error'
import { useInvite } from './api/save-person'
import { OneTimeLink } from './one-time-link'
import { RoleChecks } from './role-checks'

/** Adds a person and shows their one-time link. */
export function AddPerson() {
  const [roles, setRoles] = useState<Role[]>(['surveyor'])
  const invite = useInvite()
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const { name = '', email = '' } = Object.fromEntries(new FormData(event.currentTarget)) as Record<
      string,
      string
    >
    invite.mutate({ name, email, roles })
  }
  if (invite.data) {
    const { person, link, expires } = invite.data
    return <OneTimeLink name={person.name} link={link} expires={expires} />
  }
  const of = (path: string) => fieldError(invite.error, path)
  return (
    <form onSubmit={submit} className="flex flex-col gap-4">
      {invite.error ? <ErrorNote message={messageOf(invite.error)} /> : null}
      <TextField label="Name" name="name" required maxLength={120} error={of('name')} />
      <TextField label="E-mail address" name="email" type="email" required error={of('email')} />
      <RoleChecks value={roles} onChange={setRoles} error={of('roles')} />
      <Button type="submit" look="primary" busy={invite.isPending} disabled={roles.length === 0}>
        Add and make the link
      </Button>
    </form>
  )
}
