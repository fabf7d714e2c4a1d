import postgres from 'postgres'
import { inject } from 'vitest'
import { openDatabase, type OpenDatabase } from '../../server/database/client'

const TEMPLATE = 'tautbook_template'

export interface TestDatabase extends OpenDatabase {
  url: string
  /** Empties every table. */
  reset: () => Promise<void>
}

/** One database per worker and number of databases a file asks for; a later file of the worker gets a new copy. */
let opened = 0

/**
 * A fresh copy of the migrated template, for one test file. Close it in `afterAll`.
 *
 * ```ts
 * const test = await openTestDatabase()
 * beforeEach(test.reset)
 * afterAll(test.close)
 * ```
 */
export async function openTestDatabase(): Promise<TestDatabase> {
  const name = `tautbook_${process.env['VITEST_POOL_ID'] ?? '0'}_${(opened += 1)}`
  const adminUrl = inject('adminUrl')
  const admin = postgres(adminUrl, { max: 1, onnotice: () => undefined })
  try {
    await admin.unsafe(`drop database if exists ${name} with (force)`)
    await admin.unsafe(`create database ${name} template ${TEMPLATE}`)
  } finally {
    await admin.end()
  }
  const url = adminUrl.replace(/[^/]*$/, name)
  const open = openDatabase({ url, connections: 4 })
  return { ...open, url, reset: await emptier(open.sql) }
}

async function emptier(sql: postgres.Sql): Promise<() => Promise<void>> {
  const tables = await sql<{ name: string }[]>`
    select format('%I.%I', schemaname, tablename) as name from pg_tables where schemaname = 'public'`
  if (tables.length === 0) return () => Promise.resolve()
  const statement = `truncate ${tables.map(({ name }) => name).join(', ')} restart identity cascade`
  return async () => {
    await sql.unsafe(statement)
  }
}
