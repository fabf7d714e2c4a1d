import type { Role } from '@shared/schemas/role'
import type { Database } from '../../server/database/client'
import { stockCompany } from '../../server/features/hardware/hardware.service'
import { type CompanyRow, createCompany } from '../factories/company'
import { createPerson, type PersonRow } from '../factories/person'
import { type Client, signedIn } from './client'
import type { TestApp } from './test-app'

/** A company with its starter hardware and rules, and people who hold one role each. */
export interface Place {
  company: CompanyRow
  /** The person with just this role; made when first asked for. */
  person: (role: Role) => Promise<PersonRow>
  /** The same person, signed in. */
  as: (role: Role) => Promise<Client>
}

/** Two companies on one server: what belongs to the one must not exist for the other. */
export interface Scene {
  test: TestApp
  database: Database
  here: Place
  elsewhere: Place
}

export async function createScene(test: TestApp): Promise<Scene> {
  const here = await createPlace(test)
  const elsewhere = await createPlace(test)
  return { test, database: test.services.database, here, elsewhere }
}

async function createPlace(test: TestApp): Promise<Place> {
  const { database } = test.services
  const company = await createCompany(database)
  await stockCompany(company.id, database)
  const people = new Map<Role, Promise<PersonRow>>()
  const clients = new Map<Role, Promise<Client>>()
  const person = (role: Role) =>
    remembered(people, role, () => createPerson(database, { companyId: company.id, roles: [role] }))
  const as = (role: Role) => remembered(clients, role, async () => signedIn(test.app, await person(role)))
  return { company, person, as }
}

function remembered<Value>(known: Map<Role, Value>, role: Role, make: () => Value): Value {
  const value = known.get(role) ?? make()
  known.set(role, value)
  return value
}
