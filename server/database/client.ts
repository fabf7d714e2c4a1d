import { drizzle, type PostgresJsDatabase } from 'drizzle-orm/postgres-js'
import postgres from 'postgres'
import * as tables from './tables/index'

/** What queries run on: the pool itself, or one transaction of it. */
export type Database = PostgresJsDatabase<typeof tables>

export interface OpenDatabase {
  database: Database
  /** The driver below, for the few things that are not queries: the session store, migrations, `LISTEN`. */
  sql: postgres.Sql
  /** Lets running queries finish, for at most five seconds. */
  close: () => Promise<void>
}

export interface DatabaseOptions {
  url: string
  /** Connections at most. */
  connections?: number
}

/** Opens a pool; the first query connects. */
export function openDatabase({ url, connections = 10 }: DatabaseOptions): OpenDatabase {
  const sql = postgres(url, {
    max: connections,
    connect_timeout: 10,
    idle_timeout: 0,
    // Notices (“relation already exists, skipping”) are no news to anybody.
    onnotice: () => undefined,
    connection: { application_name: 'tautbook' },
  })
  return {
    database: drizzle(sql, { schema: tables, casing: 'snake_case' }),
    sql,
    close: () => sql.end({ timeout: 5 }),
  }
}
