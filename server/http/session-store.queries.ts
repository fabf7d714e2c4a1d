import { and, eq, isNull, lt, ne } from 'drizzle-orm'
import type { Database } from '../database/client'
import { companies, people, sessions } from '../database/tables/index'

/** A session with the person and company it is for; a disabled person's session is none. */
export async function selectSession(database: Database, idHash: string) {
  const [row] = await database
    .select({ session: sessions, person: people, company: companies })
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
    .where(eq(sessions.idHash, idHash))
  return row
}

export async function upsertSession(
  database: Database,
  session: typeof sessions.$inferInsert,
): Promise<void> {
  const { idHash: _idHash, ...changes } = session
  await database
    .insert(sessions)
    .values(session)
    .onConflictDoUpdate({ target: sessions.idHash, set: changes })
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

export async function extendSession(database: Database, idHash: string, expiresAt: Date): Promise<void> {
  await database.update(sessions).set({ expiresAt }).where(eq(sessions.idHash, idHash))
}

export async function deleteExpiredSessions(database: Database, now: Date): Promise<void> {
  await database.delete(sessions).where(lt(sessions.expiresAt, now))
}
