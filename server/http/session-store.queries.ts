import { and, eq, isNull, lt, ne, sql } from 'drizzle-orm'
import type { Database, OpenDatabase } from '../database/client'
import { companies, people, sessions } from '../database/tables/index'
import { toSignedIn } from './account'
import type { SignedIn } from './signed-in'

/** What is read of a session, each under the name it has in `FoundRow`. */
const columns = {
  data: sql`${sessions.data}`.as('data'),
  whose: sql`${sessions.personId}`.as('whose'),
  id: sql`${people.id}`.as('id'),
  companyId: sql`${people.companyId}`.as('companyId'),
  name: sql`${people.name}`.as('name'),
  email: sql`${people.email}`.as('email'),
  roles: sql`${people.roles}`.as('roles'),
  lastSignInAt: sql`${people.lastSignInAt}`.as('lastSignInAt'),
  companyName: sql`${companies.name}`.as('companyName'),
  lengthUnit: sql`${companies.lengthUnit}`.as('lengthUnit'),
  forceUnit: sql`${companies.forceUnit}`.as('forceUnit'),
  fraction: sql`${companies.fraction}`.as('fraction'),
  keepPhotoPlace: sql`${companies.keepPhotoPlace}`.as('keepPhotoPlace'),
} satisfies Record<keyof FoundRow, unknown>

type PersonRow = Pick<typeof people.$inferSelect, 'companyId' | 'name' | 'email' | 'roles'>
type CompanyRow = Pick<
  typeof companies.$inferSelect,
  'lengthUnit' | 'forceUnit' | 'fraction' | 'keepPhotoPlace'
>
/** As the driver gives it; where there is no person, all that is theirs is null. */
interface FoundRow extends PersonRow, CompanyRow {
  data: unknown
  /** Whose session it was made for. */
  whose: string | null
  id: string | null
  lastSignInAt: string | null
  companyName: string
}

/**
 * Finds a session that has not ended, with the person and company it is for; a disabled person's session is nobody's.
 * Every request asks this: it is put together once, PostgreSQL plans it once per connection, and it is one message
 * there and one back.
 */
export function sessionFinder({ database, sql: driver }: OpenDatabase) {
  const { sql: text } = database
    .select(columns)
    .from(sessions)
    .leftJoin(
      people,
      and(
        eq(people.companyId, sessions.companyId),
        eq(people.id, sessions.personId),
        isNull(people.disabledAt),
      ),
    )
    .leftJoin(companies, eq(companies.id, people.companyId))
    .where(and(sql`${sessions.idHash} = $1`, sql`${sessions.expiresAt} > $2::timestamptz`))
    .toSQL()
  return async (idHash: string, now: Date): Promise<FoundSession | undefined> => {
    const [row] = await driver.unsafe<FoundRow[]>(text, [idHash, now.toISOString()], { prepare: true })
    return row && { data: row.data, personId: row.whose, account: accountOf(row) }
  }
}

export interface FoundSession {
  data: unknown
  /** Whose session it was made for; nobody's before sign-in. */
  personId: string | null
  /** None where that person is disabled now. */
  account: SignedIn | undefined
}

function accountOf({ id, lastSignInAt, companyName, ...row }: FoundRow): SignedIn | undefined {
  if (id === null) return undefined
  const person = { ...row, id, lastSignInAt: lastSignInAt === null ? null : new Date(lastSignInAt) }
  return toSignedIn(person, { ...row, id: row.companyId, name: companyName })
}

type SessionRow = typeof sessions.$inferInsert

/** Keeps a new session. */
export async function upsertSession(database: Database, session: SessionRow): Promise<void> {
  const { idHash: _idHash, ...changes } = session
  await database
    .insert(sessions)
    .values(session)
    .onConflictDoUpdate({ target: sessions.idHash, set: changes })
}

/** Keeps what a session has become; one that was ended meanwhile stays ended. */
export async function updateSession(database: Database, { idHash, ...changes }: SessionRow): Promise<void> {
  await database.update(sessions).set(changes).where(eq(sessions.idHash, idHash))
}

export async function deleteSession(database: Database, idHash: string): Promise<void> {
  await database.delete(sessions).where(eq(sessions.idHash, idHash))
}

/** Ends a person's sessions, all or all but the one in hand. */
export async function deleteSessionsOf(
  database: Database,
  personId: string,
  keepIdHash?: string,
): Promise<void> {
  const ofPerson = eq(sessions.personId, personId)
  await database
    .delete(sessions)
    .where(keepIdHash === undefined ? ofPerson : and(ofPerson, ne(sessions.idHash, keepIdHash)))
}

export async function deleteExpiredSessions(database: Database, now: Date): Promise<void> {
  await database.delete(sessions).where(lt(sessions.expiresAt, now))
}
