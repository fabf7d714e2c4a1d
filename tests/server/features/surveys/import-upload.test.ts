import { randomUUID } from 'node:crypto'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import supertest from 'supertest'
import { accounts } from '@shared/endpoints/accounts'
import { surveys } from '@shared/endpoints/surveys'
import { createJob } from '../../../factories/job'
import { createPerson, testPassword } from '../../../factories/person'
import { createSurveyRow } from '../../../factories/survey-record'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'
import { signedIn } from '../../../support/client'
import { createTestApp, type TestApp } from '../../../support/test-app'

let database: TestDatabase
let test: TestApp
beforeAll(async () => {
  database = await openTestDatabase()
  test = createTestApp({ open: database })
})
afterAll(() => database.close())

describe('sending a survey file', () => {
  it('of more than 2 MB is refused', async () => {
    const person = await createPerson(database.database)
    const job = await createJob(database.database, { companyId: person.companyId })
    const client = await signedIn(test.app, person)
    const body = { survey: { title: 'x'.repeat(2 * 1024 * 1024) } }
    const answer = await client.send(surveys.importSurvey, { params: { jobId: job.id }, body })
    expect(answer.status).toBe(413)
    expect((answer.body as { detail: string }).detail).toMatch(/2 MB/)
  })

  it('that is no JSON is refused', async () => {
    const person = await createPerson(database.database)
    const job = await createJob(database.database, { companyId: person.companyId })
    const agent = supertest.agent(test.app)
    const before = await agent.get(accounts.readSession.path)
    const session = await agent
      .post(accounts.signIn.path)
      .set('x-csrf-token', (before.body as { csrfToken: string }).csrfToken)
      .send({ email: person.email, password: testPassword })
    const answer = await agent
      .post(surveys.importSurvey.path.replace(':jobId', job.id))
      .set('x-csrf-token', (session.body as { csrfToken: string }).csrfToken)
      .type('application/json')
      .send('{ "survey": ')
    expect(answer.status).toBe(400)
    expect(answer.body).toMatchObject({ code: 'not-json' })
  })
})

describe('text that cannot be stored', () => {
  it('is refused where it stands, not stumbled over later', async () => {
    const person = await createPerson(database.database)
    const row = await createSurveyRow(database.database, { companyId: person.companyId })
    const client = await signedIn(test.app, person)
    const post = { id: 'P1', note: 'half a \ud83d' }
    const change = { id: randomUUID(), operation: { type: 'post.add', post } }
    const body = { revision: 0, changes: [change] }
    const answer = await client.send(surveys.changeSurvey, { params: { surveyId: row.id }, body })
    expect(answer.status).toBe(400)
    expect(answer.body).toMatchObject({ fields: [{ path: 'changes.0.operation.post.note' }] })
  })
})
