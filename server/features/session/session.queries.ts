import { and, eq, sql } from 'drizzle-orm'
import type { Database } from '../../database/client'
import { companies, people } from '../../database/tables/index'

/** A person by e-mail address, whatever its letters' case, with their company. */
export async function selectByEmail(database: Database, email: string) {
  const [row] = await database
    .select({ person: people, company: companies })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(eq(sql`lower(${people.email})`, email.toLowerCase()))
  return row
}

export async function selectAccount(
  database: Database,
  { companyId, id }: { companyId: string; id: string },
) {
  const [row] = await database
    .select({ person: people, company: companies })
    .from(people)
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(and(eq(people.companyId, companyId), eq(people.id, id)))
  return row
}

export async function updateAccount(
  database: Database,
  { companyId, id }: { companyId: string; id: string },
  changes: { passwordHash?: string; lastSignInAt?: Date },
): Promise<void> {
  await database
    .update(people)
    .set(changes)
    .where(and(eq(people.companyId, companyId), eq(people.id, id)))
}
