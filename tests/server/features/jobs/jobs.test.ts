import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { jobs as endpoints } from '@shared/endpoints/jobs'
import type { Job } from '@shared/schemas/job'
import { createJob } from '../../../factories/job'
import { createPerson } from '../../../factories/person'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'
import type { Client, Sent } from '../../../support/client'
import { createScene, type Scene } from '../../../support/scene'
import { createTestApp } from '../../../support/test-app'

let test: TestDatabase
let scene: Scene
let client: Client
let now = new Date('2026-05-04T10:00:00Z')

beforeAll(async () => {
  test = await openTestDatabase()
})
beforeEach(async () => {
  await test.reset()
  now = new Date('2026-05-04T10:00:00Z')
  scene = await createScene(createTestApp({ open: test, clock: () => now }))
  client = await scene.here.as('owner')
})
afterAll(() => test.close())

const make = (given: Partial<Parameters<typeof createJob>[1]> = {}) =>
  createJob(scene.database, { companyId: scene.here.company.id, ...given })

interface Page {
  jobs: Job[]
  next: string | null
}
async function list(query: Sent['query'] = {}): Promise<Page> {
  const answer = await client.send(endpoints.listJobs, { query })
  expect(answer.status, answer.text).toBe(200)
  return answer.body as Page
}
const titles = ({ jobs }: Page) => jobs.map(({ title }) => title)

/** Every title, page by page. */
async function walk(query: Record<string, string | number>): Promise<string[]> {
  const found: string[] = []
  let after: string | null = null
  for (let page = 0; page < 20; page += 1) {
    const answer: Page = await list({ ...query, ...(after === null ? {} : { after }) })
    found.push(...titles(answer))
    after = answer.next
    if (after === null) return found
  }
  throw new Error('The pages never ended.')
}

describe('the pages of the list', () => {
  beforeEach(async () => {
    // Two share a moment and two a date, two have no date: every page must end somewhere definite.
    const at = (minute: number) => new Date(Date.UTC(2026, 3, 1, 8, minute))
    await make({ title: 'a', updatedAt: at(1), due: '2026-06-01' })
    await make({ title: 'b', updatedAt: at(5), due: null })
    await make({ title: 'c', updatedAt: at(5), due: '2026-05-01' })
    await make({ title: 'd', updatedAt: at(3), due: '2026-06-01' })
    await make({ title: 'e', updatedAt: at(2), due: null })
  })

  it.each([1, 2, 3, 5])('go through all jobs once, newest change first, %i at a time', async (limit) => {
    const walked = await walk({ limit })
    expect([...walked.slice(0, 2)].sort()).toEqual(['b', 'c'])
    expect(walked.slice(2)).toEqual(['d', 'e', 'a'])
  })

  it.each([1, 2, 4])(
    'go through all jobs once, soonest due first and undated last, %i at a time',
    async (limit) => {
      const walked = await walk({ sort: 'due', limit })
      expect(walked[0]).toBe('c')
      expect(walked.slice(1, 3).sort()).toEqual(['a', 'd'])
      expect(walked.slice(3).sort()).toEqual(['b', 'e'])
    },
  )

  it('go through all jobs by number, highest first', async () => {
    expect(await walk({ sort: 'number', limit: 2 })).toEqual(['e', 'd', 'c', 'b', 'a'])
  })

  it('refuse a place of another order, or one that is made up', async () => {
    const { next } = await list({ sort: 'number', limit: 2 })
    for (const after of [String(next), 'made-up', Buffer.from('{}').toString('base64url')]) {
      const answer = await client.send(endpoints.listJobs, { query: { sort: 'due', after } })
      expect([answer.status, (answer.body as { code: string }).code]).toEqual([400, 'job-page-unknown'])
    }
  })

  it('show at most a hundred jobs', async () => {
    const answer = await client.send(endpoints.listJobs, { query: { limit: 101 } })
    expect(answer.body).toMatchObject({ code: 'not-valid', fields: [{ path: 'limit' }] })
  })
})

describe('finding a job', () => {
  it('looks for every word in number, title, customer and site, whatever the letters’ case', async () => {
    await make({ title: 'Harbour deck', customer: 'Ødegård', site: '7 Quay' })
    await make({ title: 'Harbour stair', customer: 'Ines', site: '9 Mill Lane' })
    expect(titles(await list({ search: 'HARBOUR' }))).toHaveLength(2)
    expect(titles(await list({ search: 'harbour mill' }))).toEqual(['Harbour stair'])
    expect(titles(await list({ search: ' ødegård ' }))).toEqual(['Harbour deck'])
    expect(titles(await list({ search: '2 stair' }))).toEqual(['Harbour stair'])
    expect(titles(await list({ search: 'nowhere' }))).toEqual([])
  })

  it('takes signs literally', async () => {
    await make({ title: '100% oak' })
    await make({ title: '1000 oak' })
    await make({ title: 'back_slash \\ here' })
    expect(titles(await list({ search: '100%' }))).toEqual(['100% oak'])
    expect(titles(await list({ search: '_' }))).toEqual(['back_slash \\ here'])
    expect(titles(await list({ search: '\\' }))).toEqual(['back_slash \\ here'])
  })

  it('filters by stage and person together', async () => {
    const { id: personId } = await scene.here.person('surveyor')
    await make({ title: 'theirs, shop', personId, stage: 'shop' })
    await make({ title: 'theirs, fit', personId, stage: 'fit' })
    await make({ title: 'nobody’s, shop', stage: 'shop' })
    expect(titles(await list({ stage: 'shop', personId }))).toEqual(['theirs, shop'])
    expect(titles(await list({ stage: 'shop' }))).toHaveLength(2)
    expect(titles(await list({ personId }))).toHaveLength(2)
  })
})

describe('a job', () => {
  it('gets the company’s next number, without gaps, also when many are opened at once', async () => {
    const opened = await Promise.all(
      Array.from({ length: 8 }, (_, i) => client.send(endpoints.createJob, { body: { title: `Job ${i}` } })),
    )
    const numbers = opened.map(({ body }) => (body as Job).number).sort((a, b) => a - b)
    expect(numbers).toEqual([1, 2, 3, 4, 5, 6, 7, 8])
    const theirs = await scene.elsewhere.as('owner')
    const first = await theirs.send(endpoints.createJob, { body: { title: 'Theirs' } })
    expect(first.body).toMatchObject({ number: 1 })
  })

  it('says in its fields what is wrong', async () => {
    const answer = await client.send(endpoints.createJob, { body: { title: '  ', due: '2026-02-30' } })
    expect(answer.status).toBe(400)
    expect((answer.body as { fields: { path: string }[] }).fields.map(({ path }) => path)).toEqual([
      'title',
      'due',
    ])
  })

  it('is given only to somebody of the company who is not disabled, and may stay with whoever has it', async () => {
    const leaver = await createPerson(scene.database, { companyId: scene.here.company.id, disabledAt: now })
    const stranger = await scene.elsewhere.person('surveyor')
    const job = await make({ personId: leaver.id })
    const params = { jobId: job.id }
    for (const personId of [stranger.id, leaver.id]) {
      const answer = await client.send(endpoints.createJob, { body: { title: 'New', personId } })
      expect(answer.body).toMatchObject({ code: 'job-person-unknown', fields: [{ path: 'personId' }] })
    }
    const kept = await client.send(endpoints.changeJob, {
      params,
      body: { title: 'Kept', personId: leaver.id },
    })
    expect(kept.body).toMatchObject({ title: 'Kept', personName: leaver.name })
    const given = await client.send(endpoints.changeJob, { params, body: { personId: stranger.id } })
    expect(given.body).toMatchObject({ code: 'job-person-unknown' })
    const freed = await client.send(endpoints.changeJob, { params, body: { personId: null } })
    expect(freed.body).toMatchObject({ personId: null, personName: null })
  })

  it('comes first in the list once it has moved', async () => {
    const old = await make({ title: 'old', updatedAt: new Date('2026-01-01T00:00:00Z') })
    await make({ title: 'newer', updatedAt: new Date('2026-02-01T00:00:00Z') })
    await client.send(endpoints.moveJob, { params: { jobId: old.id }, body: { stage: 'lost' } })
    const { jobs } = await list()
    expect(jobs[0]).toMatchObject({ title: 'old', stage: 'lost', updatedAt: now.toISOString() })
  })
})
