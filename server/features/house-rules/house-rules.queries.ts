import { eq } from 'drizzle-orm'
import type { Database } from '../../database/client'
import { houseRules } from '../../database/tables/house-rules'

export async function selectHouseRules(database: Database, companyId: string): Promise<unknown> {
  const [row] = await database
    .select({ document: houseRules.document })
    .from(houseRules)
    .where(eq(houseRules.companyId, companyId))
  return row?.document
}

export async function upsertHouseRules(
  database: Database,
  companyId: string,
  document: unknown,
): Promise<void> {
  await database
    .insert(houseRules)
    .values({ companyId, document })
    .onConflictDoUpdate({ target: houseRules.companyId, set: { document, updatedAt: new Date() } })
}
