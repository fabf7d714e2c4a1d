import { afterAll, beforeEach, describe, expect, it } from 'vitest'
import { explainDatabaseFailure } from '../../../server/database/explain-failure'
import { migrateDatabase } from '../../../server/database/migrate'
import { openTestDatabase } from '../../setup/database'

const test = await openTestDatabase()
beforeEach(test.reset)
afterAll(test.close)

const failureOf = (url: string): Promise<unknown> =>
  migrateDatabase({ url, folder: 'drizzle' }).then(
    () => undefined,
    (error: unknown) => error,
  )

const changed = (change: (url: URL) => void): string => {
  const url = new URL(test.url)
  change(url)
  return url.href
}

describe('migrateDatabase', () => {
  it('finds nothing to do in a database that is up to date, even when two start at once', async () => {
    const before = await test.sql`select count(*)::int as n from drizzle.__drizzle_migrations`
    await Promise.all([1, 2].map(() => migrateDatabase({ url: test.url, folder: 'drizzle' })))
    const after = await test.sql`select count(*)::int as n from drizzle.__drizzle_migrations`
    expect(after).toEqual(before)
  })

  it.each([
    ['a wrong password', changed((url) => (url.password = 'wrong')), /refused the user name or password/],
    [
      'no such database',
      changed((url) => (url.pathname = '/absent')),
      /the database 127\.0\.0\.1:\d+\/absent does not exist/,
    ],
    [
      'nobody listening',
      changed((url) => (url.port = '1')),
      /Nothing answers at the database 127\.0\.0\.1:1\//,
    ],
  ])('says in one sentence what %s means, without the password', async (_what, url, sentence) => {
    const explained = explainDatabaseFailure(await failureOf(url), url)
    expect(explained).toMatch(sentence)
    expect(explained).not.toContain(new URL(url).password)
    expect(explained).not.toContain('\n')
  })
})

describe('explainDatabaseFailure', () => {
  it('leaves faults of ours alone', () => {
    expect(explainDatabaseFailure(new TypeError('x is undefined'), test.url)).toBeUndefined()
  })
})
