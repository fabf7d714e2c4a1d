import { and, eq, gt, isNull, lt, ne, sql } from 'drizzle-orm'
import type { Database } from '../database/client'
import { companies, people, sessions } from '../database/tables/index'

/**
 * Finds a session that has not ended, with the person and company it is for; a disabled person's session is nobody's.
 * Every request asks this, so it is put together once and PostgreSQL plans it once per connection.
 */
export function sessionFinder(database: Database) {
  const { id, companyId, name, email, roles, lastSignInAt } = people
  const query = database
    .select({
      data: sessions.data,
      personId: sessions.personId,
      person: { id, companyId, name, email, roles, lastSignInAt },
      company: companies,
    })
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
    .where(
      and(
        eq(sessions.idHash, sql.placeholder('idHash')),
        gt(sessions.expiresAt, sql`${sql.placeholder('now')}::timestamptz`),
      ),
    )
    .prepare('session')
  return async (idHash: string, now: Date) => (await query.execute({ idHash, now: now.toISOString() }))[0]
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
