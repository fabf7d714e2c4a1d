import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import { jobs } from '@shared/endpoints/jobs'
import type { Request } from 'express'
import type { SessionData } from 'express-session'
import { people } from '../../../../server/database/tables/people'
import { sessions } from '../../../../server/database/tables/sessions'
import { SessionStore } from '../../../../server/http/session-store'
import { createPerson, testPassword } from '../../../factories/person'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'
import { signedIn, visitor } from '../../../support/client'
import { createTestApp, type TestApp } from '../../../support/test-app'

let database: TestDatabase
let test: TestApp
let now = new Date('2026-05-04T10:00:00Z')

beforeAll(async () => {
  database = await openTestDatabase()
  test = createTestApp({ open: database, clock: () => now })
})
beforeEach(async () => {
  await database.reset()
  now = new Date('2026-05-04T10:00:00Z')
})
afterAll(async () => {
  await database.close()
})

const codeOf = (answer: { body: unknown }) => (answer.body as { code: string }).code

describe('signing in', () => {
  it('begins a new session under a new id and a new token', async () => {
    const person = await createPerson(database.database)
    const client = visitor(test.app)
    const before = await client.send(accounts.readSession)
    expect(before.body).toMatchObject({ session: null })
    const answer = await client.send(accounts.signIn, {
      body: { email: person.email, password: testPassword },
    })
    expect(answer.status).toBe(200)
    const cookie = String(answer.headers['set-cookie'])
    expect(cookie).toMatch(/HttpOnly/)
    expect(cookie).toMatch(/SameSite=Lax/)
    const { csrfToken } = answer.body as { csrfToken: string }
    expect(csrfToken).not.toBe((before.body as { csrfToken: string }).csrfToken)
    expect((await database.database.select().from(sessions)).map(({ personId }) => personId)).toContain(
      person.id,
    )
  })

  it('says the same for an unknown address and a wrong password', async () => {
    const person = await createPerson(database.database)
    const client = visitor(test.app)
    const wrong = await client.send(accounts.signIn, {
      body: { email: person.email, password: 'not this one' },
    })
    const unknown = await client.send(accounts.signIn, {
      body: { email: 'nobody@example.com', password: 'not this one' },
    })
    expect(wrong.status).toBe(401)
    expect(unknown.body).toEqual(wrong.body)
    expect(codeOf(wrong)).toBe('wrong-sign-in')
  })

  it('reads an address in any case and keeps the database free of session ids', async () => {
    const person = await createPerson(database.database, { email: 'Mixed.Case@example.com' })
    const client = await signedIn(test.app, { email: 'mixed.case@EXAMPLE.com' })
    const answer = await client.send(accounts.readSession)
    expect(answer.body).toMatchObject({ session: { person: { id: person.id } } })
    const [row] = await database.database.select().from(sessions)
    expect(row?.idHash).toMatch(/^[0-9a-f]{64}$/)
  })

  it('refuses a disabled person and one who has not set a password', async () => {
    const disabled = await createPerson(database.database, { disabledAt: now })
    const invited = await createPerson(database.database, { passwordHash: null })
    await expect(signedIn(test.app, disabled)).rejects.toThrow(/wrong-sign-in/)
    await expect(signedIn(test.app, invited)).rejects.toThrow(/wrong-sign-in/)
  })

  it('refuses, not cuts, passwords over 72 bytes', async () => {
    const person = await createPerson(database.database)
    const long = testPassword.padEnd(100, 'x')
    await expect(signedIn(test.app, person, long)).rejects.toThrow(/wrong-sign-in/)
  })

  it('limits guesses at one address', async () => {
    const own = createTestApp({ open: database })
    const person = await createPerson(database.database)
    const client = visitor(own.app)
    const statuses: number[] = []
    for (let guess = 0; guess < 12; guess += 1) {
      const answer = await client.send(accounts.signIn, {
        body: { email: person.email, password: `guess ${guess}` },
      })
      statuses.push(answer.status)
    }
    expect(statuses.slice(0, 10)).toEqual(Array<number>(10).fill(401))
    expect(statuses.at(-1)).toBe(429)
  })
})

describe('a session', () => {
  it('ends on the server at sign-out', async () => {
    const person = await createPerson(database.database)
    const client = await signedIn(test.app, person)
    expect((await client.send(accounts.signOut)).status).toBe(204)
    expect((await client.send(jobs.listJobs)).status).toBe(401)
    expect(await database.database.select().from(sessions)).toHaveLength(0)
  })

  it('ends by itself after thirty days without use, and lives on with use', async () => {
    const person = await createPerson(database.database)
    const client = await signedIn(test.app, person)
    now = new Date(now.getTime() + 29 * 86_400_000)
    expect((await client.send(jobs.listJobs)).status).toBe(200)
    now = new Date(now.getTime() + 29 * 86_400_000)
    expect((await client.send(jobs.listJobs)).status).toBe(200)
    now = new Date(now.getTime() + 31 * 86_400_000)
    expect((await client.send(jobs.listJobs)).status).toBe(401)
  })

  it('sees the roles as they are now', async () => {
    const person = await createPerson(database.database, { roles: ['owner'] })
    const client = await signedIn(test.app, person)
    expect((await client.send(accounts.changeCompany, { body: { fraction: 32 } })).status).toBe(200)
    await database.database.update(people).set({ roles: ['shop'] })
    expect((await client.send(accounts.changeCompany, { body: { fraction: 16 } })).status).toBe(403)
  })
})

describe('a session of somebody disabled', () => {
  it('is nobody’s, even where its row is still there', async () => {
    const person = await createPerson(database.database)
    const client = await signedIn(test.app, person)
    await database.database.update(people).set({ disabledAt: now })
    expect((await client.send(jobs.listJobs)).status).toBe(401)
  })

  it('does not come back when a request that was under way writes it after it has ended', async () => {
    const person = await createPerson(database.database)
    const body = { email: person.email, password: testPassword }
    const { headers } = await visitor(test.app).send(accounts.signIn, { body })
    const id = /tautbook=s%3A([^.]+)\./.exec(String(headers['set-cookie']))?.[1] ?? ''
    const store = new SessionStore(database.database, () => now)
    const underWay = await new Promise<SessionData>((resolve) =>
      store.get(id, (_error, found) => resolve(found as SessionData)),
    )
    expect(underWay).toMatchObject({ person: { id: person.id } })
    const session = store.createSession({ sessionID: id } as Request, underWay)
    await database.database.delete(sessions)
    await new Promise((resolve) => store.set(id, session, resolve))
    expect(await database.database.select().from(sessions)).toEqual([])
  })
})

describe('forgery', () => {
  it('refuses a change without the token, with another token, or from another site', async () => {
    const person = await createPerson(database.database, { roles: ['owner'] })
    const client = await signedIn(test.app, person)
    const body = { name: 'Taken over' }
    for (const csrf of [null, 'another-token']) {
      const answer = await client.send(accounts.changeCompany, { body, csrf })
      expect([answer.status, codeOf(answer)]).toEqual([403, 'stale-page'])
    }
    const headers = { Origin: 'https://elsewhere.example' }
    const elsewhere = await client.send(accounts.changeCompany, { body, headers })
    expect(elsewhere.status).toBe(403)
  })
})

describe('the own password', () => {
  it('changes with the present one and ends the other sessions', async () => {
    const person = await createPerson(database.database)
    const [here, there] = [await signedIn(test.app, person), await signedIn(test.app, person)]
    const next = 'forty feet of cable'
    const wrong = await here.send(accounts.changePassword, { body: { current: 'no', next } })
    expect(wrong.body).toMatchObject({ code: 'wrong-password', fields: [{ path: 'current' }] })
    const done = await here.send(accounts.changePassword, { body: { current: testPassword, next } })
    expect(done.status).toBe(204)
    expect((await here.send(jobs.listJobs)).status).toBe(200)
    expect((await there.send(jobs.listJobs)).status).toBe(401)
    await expect(signedIn(test.app, person)).rejects.toThrow()
    await signedIn(test.app, person, next)
  })

  it('must be long enough and none of the commonest', async () => {
    const person = await createPerson(database.database)
    const client = await signedIn(test.app, person)
    const short = await client.send(accounts.changePassword, {
      body: { current: testPassword, next: 'elevenchars' },
    })
    expect(short.body).toMatchObject({ code: 'not-valid', fields: [{ path: 'next' }] })
    const common = await client.send(accounts.changePassword, {
      body: { current: testPassword, next: '123456789012' },
    })
    expect(codeOf(common)).toBe('password-common')
  })
})
