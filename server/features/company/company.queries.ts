import { eq } from 'drizzle-orm'
import type { Database } from '../../database/client'
import { companies } from '../../database/tables/index'

export type CompanyRow = typeof companies.$inferSelect

export async function insertCompany(
  database: Database,
  company: typeof companies.$inferInsert,
): Promise<CompanyRow> {
  const [row] = await database.insert(companies).values(company).returning()
  if (!row) throw new Error('A company was inserted and no row came back.')
  return row
}

export async function updateCompany(
  database: Database,
  companyId: string,
  changes: Partial<typeof companies.$inferInsert>,
): Promise<CompanyRow | undefined> {
  const [row] = await database.update(companies).set(changes).where(eq(companies.id, companyId)).returning()
  return row
}

export async function selectCompany(database: Database, companyId: string): Promise<CompanyRow | undefined> {
  const [row] = await database.select().from(companies).where(eq(companies.id, companyId))
  return row
}
