import { drizzle } from 'drizzle-orm/postgres-js'
import { migrate } from 'drizzle-orm/postgres-js/migrator'
import postgres from 'postgres'

export interface MigrationOptions {
  url: string
  /** Where the migrations lie. */
  folder: string
}

/** Any number of our own; two servers starting at once take turns by it. */
const MIGRATION_LOCK = 460_046

/**
 * Brings the database to the present shape. One connection holds a lock meanwhile, so that of two servers started at
 * once the second waits and then finds nothing to do.
 */
export async function migrateDatabase({ url, folder }: MigrationOptions): Promise<void> {
  const sql = postgres(url, { max: 1, connect_timeout: 10, onnotice: () => undefined })
  try {
    await sql`select pg_advisory_lock(${MIGRATION_LOCK})`
    await migrate(drizzle(sql), { migrationsFolder: folder })
  } finally {
    await sql.end({ timeout: 5 })
  }
}
