import type { Company } from '@shared/schemas/company'
import type { Person } from '@shared/schemas/person'
import type { companies, people } from '../database/tables/index'
import type { SignedIn } from './signed-in'

type PersonRow = typeof people.$inferSelect
type CompanyRow = typeof companies.$inferSelect

/** A company as everybody in it sees it. */
export const presentCompany = (row: CompanyRow): Company => ({
  id: row.id,
  name: row.name,
  units: { length: row.lengthUnit, force: row.forceUnit },
  fraction: row.fraction === 64 ? 64 : row.fraction === 32 ? 32 : 16,
  keepPhotoPlace: row.keepPhotoPlace,
})

/** A person as the people of the company see them. */
export const presentPerson = (row: PersonRow): Person => ({
  id: row.id,
  name: row.name,
  email: row.email,
  roles: row.roles,
  state: row.disabledAt ? 'disabled' : row.passwordHash === null ? 'invited' : 'active',
  lastSignIn: row.lastSignInAt?.toISOString() ?? null,
})

/** The person of a request. */
export const toSignedIn = (
  person: Pick<PersonRow, 'id' | 'companyId' | 'name' | 'email' | 'roles' | 'lastSignInAt'>,
  company: CompanyRow,
): SignedIn => ({
  id: person.id,
  companyId: person.companyId,
  name: person.name,
  email: person.email,
  roles: person.roles,
  lastSignIn: person.lastSignInAt?.toISOString() ?? null,
  company: presentCompany(company),
})
