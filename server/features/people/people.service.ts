import type { Person } from '@shared/schemas/person'
import type { Role } from '@shared/schemas/role'
import type { Database } from '../../database/client'
import { notFound } from '../../errors'
import { presentPerson } from '../../http/account'
import { deleteSessionsOf } from '../../http/session-store.queries'
import { makeInvitation } from './invitations.service'
import { emailTaken, lastOwner } from './people.errors'
import {
  deleteInvitationsOf,
  insertPerson,
  lockPeople,
  type PersonKey,
  type PersonRow,
  selectPeople,
  updatePerson,
} from './people.queries'

/** The people of a company, by name. */
export async function listPeople(database: Database, companyId: string): Promise<Person[]> {
  return (await selectPeople(database, companyId)).map(presentPerson)
}

interface NewPerson {
  companyId: string
  name: string
  email: string
}

/** Adds a person and makes the one-time link to hand to them. */
export async function invitePerson(
  database: Database,
  { roles, ...person }: NewPerson & { roles: Role[] },
  link: { now: Date; address: string },
) {
  return database.transaction(async (transaction) => {
    const row = await insertPerson(transaction, { ...person, roles: [...new Set(roles)] })
    if (!row) throw emailTaken()
    return { person: presentPerson(row), ...(await makeInvitation(transaction, row, link)) }
  })
}

/** Makes a new one-time link for a person of the company. */
export async function renewInvitation(
  database: Database,
  key: PersonKey,
  link: { now: Date; address: string },
) {
  return database.transaction(async (transaction) => {
    const row = (await lockPeople(transaction, key.companyId)).find(({ id }) => id === key.id)
    if (!row) throw notFound('person')
    return { person: presentPerson(row), ...(await makeInvitation(transaction, row, link)) }
  })
}

/** The first person of a new company. */
export async function addOwner(
  transaction: Database,
  person: NewPerson & { passwordHash: string },
): Promise<PersonRow> {
  const owner = await insertPerson(transaction, { ...person, roles: ['owner'] })
  if (!owner) throw emailTaken()
  return owner
}

/** Changes a person's name or roles, disables or enables them; whoever is disabled is signed out everywhere. */
export async function changePerson(
  database: Database,
  key: PersonKey,
  { name, roles, disabled, now }: { name?: string; roles?: Role[]; disabled?: boolean; now: Date },
): Promise<Person> {
  return database.transaction(async (transaction) => {
    const everybody = await lockPeople(transaction, key.companyId)
    const person = everybody.find(({ id }) => id === key.id)
    if (!person) throw notFound('person')
    const changed = {
      name: name ?? person.name,
      roles: roles ? [...new Set(roles)] : person.roles,
      disabledAt: disabled === undefined ? person.disabledAt : disabled ? (person.disabledAt ?? now) : null,
    }
    if (!everybody.some((other) => isOwner(other.id === person.id ? { ...other, ...changed } : other)))
      throw lastOwner()
    if (disabled) {
      await deleteSessionsOf(transaction, person.id)
      await deleteInvitationsOf(transaction, person)
    }
    const row = await updatePerson(transaction, key, changed)
    if (!row) throw notFound('person')
    return presentPerson(row)
  })
}

/** Somebody who can run the company today. */
const isOwner = ({ roles, disabledAt, passwordHash }: PersonRow): boolean =>
  roles.includes('owner') && !disabledAt && passwordHash !== null
