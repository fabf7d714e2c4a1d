import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import { jobs } from '@shared/endpoints/jobs'
import type { Person } from '@shared/schemas/person'
import { invitations } from '../../../../server/database/tables/invitations'
import { createPerson } from '../../../factories/person'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'
import { type Client, signedIn, visitor } from '../../../support/client'
import { createScene, type Scene } from '../../../support/scene'
import { createTestApp } from '../../../support/test-app'

const DAY = 86_400_000
let test: TestDatabase
let scene: Scene
let owner: Client
let now = new Date('2026-05-04T10:00:00Z')

beforeAll(async () => {
  test = await openTestDatabase()
})
beforeEach(async () => {
  await test.reset()
  now = new Date('2026-05-04T10:00:00Z')
  scene = await createScene(createTestApp({ open: test, clock: () => now }))
  owner = await scene.here.as('owner')
})
afterAll(() => test.close())

interface Invitation {
  person: Person
  link: string
  expires: string
}
const newcomer = { name: 'Wren Tillotson', email: 'Wren@Example.com', roles: ['shop'] }
const password = 'nine coils of twine'
const tokenOf = ({ link }: Invitation) => link.replace(/.*\//, '')

async function invite(): Promise<Invitation> {
  const answer = await owner.send(accounts.invitePerson, { body: newcomer })
  expect(answer.status, answer.text).toBe(201)
  return answer.body as Invitation
}
const accept = (token: string) =>
  visitor(scene.test.app).send(accounts.acceptInvitation, { params: { token }, body: { password } })

describe('a one-time link', () => {
  it('signs its person in with the password they chose, once', async () => {
    const invitation = await invite()
    expect(invitation.person).toMatchObject({ email: 'wren@example.com', state: 'invited' })
    expect((await accept(tokenOf(invitation))).status).toBe(200)
    expect((await accept(tokenOf(invitation))).body).toMatchObject({ status: 404, code: 'link-used-up' })
    await signedIn(scene.test.app, { email: 'wren@example.com' }, password)
  })

  it('works once when two use it at the same moment', async () => {
    const token = tokenOf(await invite())
    const answers = await Promise.all([accept(token), accept(token)])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 404])
  })

  it('ends after seven days', async () => {
    const invitation = await invite()
    expect(invitation.expires).toBe('2026-05-11T10:00:00.000Z')
    now = new Date(now.getTime() + 7 * DAY)
    expect((await accept(tokenOf(invitation))).body).toMatchObject({ code: 'link-used-up' })
  })

  it('stops working when a newer one is made, or its person is disabled', async () => {
    const invitation = await invite()
    const params = { personId: invitation.person.id }
    const renewed = (await owner.send(accounts.renewInvitation, { params })).body as Invitation
    expect((await accept(tokenOf(invitation))).status).toBe(404)
    await owner.send(accounts.changePerson, { params, body: { disabled: true } })
    expect((await accept(tokenOf(renewed))).status).toBe(404)
  })

  it('is not kept as it is', async () => {
    const token = tokenOf(await invite())
    const rows = await scene.database.select().from(invitations)
    expect(rows).toHaveLength(1)
    expect(JSON.stringify(rows)).not.toContain(token)
  })

  it('gives a person who forgot the password a new one and ends their sessions', async () => {
    const person = await createPerson(scene.database, { companyId: scene.here.company.id })
    const client = await signedIn(scene.test.app, person)
    const renewed = await owner.send(accounts.renewInvitation, { params: { personId: person.id } })
    expect((await accept(tokenOf(renewed.body as Invitation))).status).toBe(200)
    expect((await client.send(jobs.listJobs)).status).toBe(401)
    await signedIn(scene.test.app, person, password)
  })

  it('is not made for an address that signs in anywhere already', async () => {
    const { email } = await scene.elsewhere.person('shop')
    const answer = await owner.send(accounts.invitePerson, {
      body: { ...newcomer, email: email.toUpperCase() },
    })
    expect(answer.body).toMatchObject({ status: 409, code: 'email-taken', fields: [{ path: 'email' }] })
  })
})

describe('disabling a person', () => {
  it('ends their sessions at once and keeps them out until they are enabled', async () => {
    const person = await scene.here.person('shop')
    const client = await scene.here.as('shop')
    const params = { personId: person.id }
    expect((await client.send(jobs.listJobs)).status).toBe(200)
    const disabled = await owner.send(accounts.changePerson, { params, body: { disabled: true } })
    expect(disabled.body).toMatchObject({ state: 'disabled' })
    expect((await client.send(jobs.listJobs)).status).toBe(401)
    await expect(signedIn(scene.test.app, person)).rejects.toThrow(/wrong-sign-in/)
    await owner.send(accounts.changePerson, { params, body: { disabled: false } })
    expect((await client.send(jobs.listJobs)).status).toBe(401)
    await signedIn(scene.test.app, person)
  })
})

describe('the last active owner', () => {
  it.each([{ disabled: true }, { roles: ['surveyor'] }])('stays: %o is refused', async (body) => {
    const { id: personId } = await scene.here.person('owner')
    // Neither of these could run the company.
    const companyId = scene.here.company.id
    await createPerson(scene.database, { companyId, roles: ['owner'], disabledAt: now })
    await createPerson(scene.database, { companyId, roles: ['owner'], passwordHash: null })
    const answer = await owner.send(accounts.changePerson, { params: { personId }, body })
    expect(answer.body).toMatchObject({ status: 409, code: 'last-owner' })
    expect((await owner.send(accounts.readCompany)).status).toBe(200)
  })

  it('may go once there is another, and of two who go at once one stays', async () => {
    const other = await createPerson(scene.database, {
      companyId: scene.here.company.id,
      roles: ['owner', 'shop'],
    })
    const otherClient = await signedIn(scene.test.app, other)
    const { id } = await scene.here.person('owner')
    const body = { roles: ['fitter'] }
    const answers = await Promise.all([
      owner.send(accounts.changePerson, { params: { personId: id }, body }),
      otherClient.send(accounts.changePerson, { params: { personId: other.id }, body }),
    ])
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409])
  })
})
