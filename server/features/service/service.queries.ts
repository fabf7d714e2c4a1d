import { sql } from 'drizzle-orm'
import type { Database } from '../../database/client'

/** @throws when the database does not answer. */
export async function askDatabase(database: Database): Promise<void> {
  await database.execute(sql`select 1`)
}
