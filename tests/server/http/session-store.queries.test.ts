import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { openDatabase, type OpenDatabase } from '../../../server/database/client'
import { people, sessions } from '../../../server/database/tables/index'
import { sessionFinder } from '../../../server/http/session-store.queries'
import { createPerson, type PersonRow } from '../../factories/person'
import { openTestDatabase, type TestDatabase } from '../../setup/database'

let test: TestDatabase
/** Of one connection, so that what it remembers can be asked for. */
let open: OpenDatabase
let person: PersonRow
beforeAll(async () => {
  test = await openTestDatabase()
  open = openDatabase({ url: test.url, connections: 1 })
})
afterAll(async () => {
  await open.close()
  await test.close()
})
const now = new Date('2026-05-14T10:00:00Z')
const idHash = 'a hash'
beforeEach(async () => {
  await test.reset()
  const lastSignInAt = new Date('2026-05-01T08:00:00.250Z')
  person = await createPerson(test.database, { roles: ['owner', 'fitter'], lastSignInAt })
  await test.database.insert(sessions).values({
    idHash,
    companyId: person.companyId,
    personId: person.id,
    data: { csrf: 'token' },
    expiresAt: new Date('2026-05-14T10:00:01Z'),
  })
})

describe('looking a session up', () => {
  it('brings its data, the person and their company, read in one go', async () => {
    expect(await sessionFinder(open.database)(idHash, now)).toMatchObject({
      data: { csrf: 'token' },
      personId: person.id,
      person: {
        id: person.id,
        companyId: person.companyId,
        name: person.name,
        roles: ['owner', 'fitter'],
        lastSignInAt: new Date('2026-05-01T08:00:00.250Z'),
      },
      company: { id: person.companyId, lengthUnit: 'in', forceUnit: 'lbf', fraction: 16 },
    })
  })

  it('finds nothing once it has ended, and nobody where the person is disabled', async () => {
    const find = sessionFinder(open.database)
    expect(await find(idHash, new Date('2026-05-14T10:00:01Z'))).toBeUndefined()
    expect(await find('another', now)).toBeUndefined()
    await test.database.update(people).set({ disabledAt: now })
    expect(await find(idHash, now)).toMatchObject({ personId: person.id, person: null })
  })

  it('is read by PostgreSQL once per connection, however often it is asked', async () => {
    const find = sessionFinder(open.database)
    for (let i = 0; i < 3; i += 1) await find(idHash, now)
    const known = await open.sql<{ statement: string }[]>`
      select statement from pg_prepared_statements where statement like ${'%from "sessions"%'}`
    expect(known).toHaveLength(1)
  })
})
