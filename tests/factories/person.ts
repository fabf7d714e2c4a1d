import { hashSync } from 'bcryptjs'
import type { Database } from '../../server/database/client'
import { people } from '../../server/database/tables/people'
import { createCompany } from './company'

export type PersonRow = typeof people.$inferSelect

/** The password of everybody made here. */
export const testPassword = 'a lantern on the quay'
/** Cheap on purpose: what a hash costs is tested where hashes are made. */
const passwordHash = hashSync(testPassword, 4)

let made = 0

/** An active person, the surveyor of a new company unless said otherwise. */
export async function createPerson(
  database: Database,
  given: Partial<typeof people.$inferInsert> = {},
): Promise<PersonRow> {
  const number = (made += 1)
  const companyId = given.companyId ?? (await createCompany(database)).id
  const [person] = await database
    .insert(people)
    .values({
      name: `Person ${number}`,
      email: `person-${number}@example.com`,
      roles: ['surveyor'],
      passwordHash,
      ...given,
      companyId,
    })
    .returning()
  return person!
}
