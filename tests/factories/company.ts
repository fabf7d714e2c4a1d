import type { Database } from '../../server/database/client'
import { companies } from '../../server/database/tables/companies'

export type CompanyRow = typeof companies.$inferSelect

let made = 0

/** A company measured in inches; what matters to a test is given. */
export async function createCompany(
  database: Database,
  given: Partial<typeof companies.$inferInsert> = {},
): Promise<CompanyRow> {
  const name = `Company ${(made += 1)}`
  const values = { name, lengthUnit: 'in' as const, forceUnit: 'lbf' as const, ...given }
  const [company] = await database.insert(companies).values(values).returning()
  return company!
}
