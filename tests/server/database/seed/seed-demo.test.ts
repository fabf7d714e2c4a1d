import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { roles } from '@shared/permissions/roles'
import {
  memoryPhotoStorage,
  type MemoryPhotoStorage,
} from '../../../../server/adapters/fakes/memory-photo-storage'
import { demoSignIns } from '../../../../server/database/seed/demo-company'
import { seedDemo } from '../../../../server/database/seed/seed-demo'
import { companies } from '../../../../server/database/tables/companies'
import { jobs } from '../../../../server/database/tables/jobs'
import { people } from '../../../../server/database/tables/people'
import { surveys } from '../../../../server/database/tables/surveys'
import { readCutList } from '../../../../server/features/cut-list/cut-list.service'
import { readHistory } from '../../../../server/features/surveys/surveys.service'
import { createCompany } from '../../../factories/company'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'

let test: TestDatabase
let photoStorage: MemoryPhotoStorage
beforeAll(async () => {
  test = await openTestDatabase()
})
afterAll(() => test.close())
beforeEach(async () => {
  await test.reset()
  photoStorage = memoryPhotoStorage()
})

const folder = new URL('../../../../demo', import.meta.url).pathname
const now = new Date('2026-12-01T09:00:00.000Z')
const seed = () => seedDemo({ database: test.database, photoStorage, clock: () => now, folder })

describe('the demo company', () => {
  it('is loaded once', async () => {
    expect(await seed()).toBe(true)
    expect(await seed()).toBe(false)
    expect(await test.database.select().from(companies)).toHaveLength(1)
    expect(photoStorage.keys()).toHaveLength(6)
  })

  it('is loaded once by two servers that start together', async () => {
    const loaded = await Promise.all([seed(), seed()])
    expect(loaded.sort()).toEqual([false, true])
    expect(await test.database.select().from(companies)).toHaveLength(1)
  })

  it('is not loaded beside a company', async () => {
    await createCompany(test.database)
    expect(await seed()).toBe(false)
  })

  it('has four people for the five roles, and jobs at every stage', async () => {
    await seed()
    const everybody = await test.database.select().from(people)
    expect(everybody.map(({ email }) => email).sort()).toEqual(demoSignIns.map(({ email }) => email).sort())
    expect(everybody).toHaveLength(4)
    expect([...new Set(everybody.flatMap((person) => person.roles))].sort()).toEqual([...roles].sort())
    const stages = (await test.database.select().from(jobs)).map(({ stage }) => stage)
    expect(new Set(stages)).toEqual(
      new Set(['measure', 'check', 'price', 'agreed', 'shop', 'fit', 'done', 'lost']),
    )
  })

  it('has three surveys with a history by the surveyor; all but the unfinished one can be cut', async () => {
    await seed()
    const rows = await test.database.select().from(surveys)
    expect(rows.map(({ title }) => title).sort()).toEqual([
      'Deck edge and stair',
      'Harbour deck',
      'Long front',
    ])
    for (const row of rows) {
      const { entries } = await readHistory(
        test.database,
        { companyId: row.companyId, surveyId: row.id },
        { limit: 200 },
      )
      expect(entries).toHaveLength(row.revision)
      expect(new Set(entries.map(({ by }) => by))).toEqual(new Set(['Imre Vasko']))
      const [company] = await test.database.select().from(companies)
      const { cutList } = await readCutList(test.database, {
        company: { ...company!, units: { length: 'in', force: 'lbf' }, fraction: 16 },
        surveyId: row.id,
        now,
      })
      const { none, cables } = cutList.totals
      expect(cables).toBeGreaterThan(10)
      expect(none).toBe(row.title === 'Long front' ? cables : 0)
    }
  })
})
