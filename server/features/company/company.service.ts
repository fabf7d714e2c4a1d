import type { z } from 'zod'
import type { accounts } from '@shared/endpoints/accounts'
import type { Company } from '@shared/schemas/company'
import type { Units } from '@shared/schemas/quantities'
import type { Database } from '../../database/client'
import { notFound } from '../../errors'
import { presentCompany, toSignedIn } from '../../http/account'
import type { SignedIn } from '../../http/signed-in'
import { stockCompany } from '../hardware/hardware.service'
import { addOwner } from '../people/people.service'
import { hashNewPassword } from '../session/passwords'
import { insertCompany, selectCompany, updateCompany } from './company.queries'

type Registration = z.output<NonNullable<typeof accounts.registerCompany.body>>

/** Registers a company with its first person as owner, stocked with the starter hardware and house rules. */
export async function registerCompany(database: Database, registration: Registration): Promise<SignedIn> {
  const passwordHash = await hashNewPassword(registration.password, 'password')
  return database.transaction(async (transaction) => {
    const company = await createCompany(transaction, {
      name: registration.company,
      units: registration.units,
    })
    const owner = await addOwner(transaction, {
      companyId: company.id,
      name: registration.name,
      email: registration.email,
      passwordHash,
    })
    return toSignedIn(owner, company)
  })
}

/** A company with the starter hardware and house rules, and nobody in it yet. */
async function createCompany(transaction: Database, { name, units }: { name: string; units: Units }) {
  const company = await insertCompany(transaction, { name, lengthUnit: units.length, forceUnit: units.force })
  await stockCompany(company.id, transaction)
  return company
}

export async function readCompany(database: Database, companyId: string): Promise<Company> {
  const row = await selectCompany(database, companyId)
  if (!row) throw notFound('company')
  return presentCompany(row)
}

/** Changes what a company says of itself; surveys already begun keep their units. */
export async function changeCompany(
  database: Database,
  companyId: string,
  { units, ...changes }: Partial<Omit<Company, 'id'>>,
): Promise<Company> {
  const columns = { ...changes, ...(units ? { lengthUnit: units.length, forceUnit: units.force } : {}) }
  if (Object.keys(columns).length === 0) return readCompany(database, companyId)
  const row = await updateCompany(database, companyId, columns)
  if (!row) throw notFound('company')
  return presentCompany(row)
}
