import { and, asc, eq } from 'drizzle-orm'
import type { Database } from './client'
import { guardRules } from './tables/guard-rules'
import { cables, fittings } from './tables/hardware'

/** The kinds of entry of a company’s catalogue are kept alike. */
const tables = { cable: cables, fitting: fittings, 'guard rules': guardRules }
export type EntryKind = keyof typeof tables

export interface EntryRow {
  key: string
  id: string
  document: unknown
  retired: boolean
  updatedAt: Date
}

interface Place {
  database: Database
  companyId: string
  kind: EntryKind
}

const columns = (kind: EntryKind) => {
  const { key, id, document, retired, updatedAt } = tables[kind]
  return { key, id, document, retired, updatedAt }
}

export const selectEntries = ({ database, companyId, kind }: Place): Promise<EntryRow[]> =>
  database
    .select(columns(kind))
    .from(tables[kind])
    .where(eq(tables[kind].companyId, companyId))
    .orderBy(asc(tables[kind].createdAt), asc(tables[kind].id))

export async function selectEntry(place: Place, key: string): Promise<EntryRow | undefined> {
  const table = tables[place.kind]
  const [row] = await place.database
    .select(columns(place.kind))
    .from(table)
    .where(and(eq(table.companyId, place.companyId), eq(table.key, key)))
  return row
}

/** Adds entries; undefined in the answer means that an id was taken and nothing was added. */
export async function insertEntries(
  { database, companyId, kind }: Place,
  documents: readonly { id: string }[],
): Promise<EntryRow[]> {
  if (documents.length === 0) return []
  return database
    .insert(tables[kind])
    .values(documents.map((document) => ({ companyId, id: document.id, document })))
    .onConflictDoNothing()
    .returning(columns(kind))
}

export async function updateEntry(
  { database, companyId, kind }: Place,
  key: string,
  changes: { document?: unknown; retired?: boolean },
): Promise<EntryRow | undefined> {
  const table = tables[kind]
  const [row] = await database
    .update(table)
    .set({ ...changes, updatedAt: new Date() })
    .where(and(eq(table.companyId, companyId), eq(table.key, key)))
    .returning(columns(kind))
  return row
}
