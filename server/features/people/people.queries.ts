import { and, asc, eq, gt } from 'drizzle-orm'
import type { Database } from '../../database/client'
import { companies, invitations, people } from '../../database/tables/index'

export interface PersonKey {
  companyId: string
  id: string
}
export type PersonRow = typeof people.$inferSelect

const withKey = ({ companyId, id }: PersonKey) => and(eq(people.companyId, companyId), eq(people.id, id))

export const selectPeople = (database: Database, companyId: string): Promise<PersonRow[]> =>
  database
    .select()
    .from(people)
    .where(eq(people.companyId, companyId))
    .orderBy(asc(people.name), asc(people.id))

/** The company's people, held until the transaction ends, so that two changes cannot remove the last owner together. */
export const lockPeople = (transaction: Database, companyId: string): Promise<PersonRow[]> =>
  transaction
    .select()
    .from(people)
    .where(eq(people.companyId, companyId))
    .orderBy(asc(people.id))
    .for('update')

/** Adds a person; undefined when the e-mail address signs in somewhere already. */
export async function insertPerson(
  database: Database,
  person: typeof people.$inferInsert,
): Promise<PersonRow | undefined> {
  const [row] = await database.insert(people).values(person).onConflictDoNothing().returning()
  return row
}

export async function updatePerson(
  database: Database,
  key: PersonKey,
  changes: Partial<typeof people.$inferInsert>,
): Promise<PersonRow | undefined> {
  const [row] = await database.update(people).set(changes).where(withKey(key)).returning()
  return row
}

/** Puts the person's one link in place of any before it. */
export async function replaceInvitation(
  database: Database,
  { companyId, id }: PersonKey,
  invitation: { tokenHash: string; expiresAt: Date },
): Promise<void> {
  await database.delete(invitations).where(eq(invitations.personId, id))
  await database.insert(invitations).values({ companyId, personId: id, ...invitation })
}

/** A link that still works, with its person and company. */
export async function selectInvitation(database: Database, tokenHash: string, now: Date) {
  const [row] = await database
    .select({ person: people, company: companies })
    .from(invitations)
    .innerJoin(people, and(eq(people.companyId, invitations.companyId), eq(people.id, invitations.personId)))
    .innerJoin(companies, eq(companies.id, people.companyId))
    .where(and(eq(invitations.tokenHash, tokenHash), gt(invitations.expiresAt, now)))
  return row
}

/** Uses a link up; false when it was used up before. */
export async function deleteInvitation(database: Database, tokenHash: string): Promise<boolean> {
  const rows = await database
    .delete(invitations)
    .where(eq(invitations.tokenHash, tokenHash))
    .returning({ personId: invitations.personId })
  return rows.length > 0
}

export async function deleteInvitationsOf(database: Database, { id }: PersonKey): Promise<void> {
  await database.delete(invitations).where(eq(invitations.personId, id))
}
