import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { accounts } from '@shared/endpoints/accounts'
import { service } from '@shared/endpoints/service'
import { openDatabase } from '../../server/database/client'
import { createPerson, testPassword } from '../factories/person'
import { openTestDatabase, type TestDatabase } from '../setup/database'
import { signedIn, visitor } from '../support/client'
import { expectRefusal } from '../support/endpoint-cases'
import { createTestApp, type TestApp } from '../support/test-app'

const clientFolder = mkdtempSync(path.join(tmpdir(), 'tautbook-client-'))
let open: TestDatabase
let test: TestApp

beforeAll(async () => {
  mkdirSync(path.join(clientFolder, 'assets'))
  writeFileSync(path.join(clientFolder, 'index.html'), '<title>Tautbook</title>')
  writeFileSync(path.join(clientFolder, 'assets', 'main-4f2a.js'), 'export {}')
  open = await openTestDatabase()
  test = createTestApp({ open, config: { clientFolder } })
})
afterAll(async () => {
  await open.close()
  rmSync(clientFolder, { recursive: true })
})

describe('the client', () => {
  it('is the same page at every address of its own, asked for anew each time', async () => {
    for (const address of ['/', '/jobs/42?tab=survey', '/apiary']) {
      const answer = await request(test.app).get(address)
      expect([answer.status, answer.text]).toEqual([200, '<title>Tautbook</title>'])
      expect(answer.headers['cache-control']).toBe('no-cache')
    }
  })

  it('has files named after their content, kept for good, and no page in place of a missing one', async () => {
    const answer = await request(test.app).get('/assets/main-4f2a.js')
    expect(answer.headers['cache-control']).toBe('public, max-age=31536000, immutable')
    const missing = await request(test.app).get('/assets/main-gone.js')
    expectRefusal(missing, 404, 'not-found')
    expect(missing.headers['cache-control'] ?? '').not.toContain('immutable')
  })

  it('runs only our own scripts, in no other page’s frame', async () => {
    const { headers } = await request(test.app).get('/')
    const policy = String(headers['content-security-policy'])
    expect(policy.split(';').map((each) => each.trim())).toEqual(
      expect.arrayContaining([
        "default-src 'self'",
        "script-src 'self'",
        "script-src-attr 'none'",
        "img-src 'self' blob: data:",
        "object-src 'none'",
        "frame-ancestors 'none'",
        "base-uri 'self'",
      ]),
    )
    expect(policy).not.toMatch(/https?:|unsafe-eval/)
    expect(headers).toMatchObject({ 'x-content-type-options': 'nosniff', 'referrer-policy': 'same-origin' })
    expect(headers).not.toHaveProperty('x-powered-by')
  })
})

describe('the interface', () => {
  it('says in JSON that there is nothing at an unknown address, whatever the method', async () => {
    expectRefusal(await request(test.app).get('/api/nothing'), 404, 'not-found')
    expectRefusal(await request(test.app).get('/api'), 404, 'not-found')
  })

  it('is never kept on the way', async () => {
    const client = await signedIn(test.app, await createPerson(open.database))
    const answer = await client.send(accounts.readCompany)
    expect(answer.headers['cache-control']).toBe('private, no-store')
  })

  it('refuses what is no JSON, and what is too much of it', async () => {
    const client = visitor(test.app)
    await client.send(accounts.readSession)
    const broken = await client.agent
      .post(accounts.signIn.path)
      .set('content-type', 'application/json')
      .send('{"email":')
    expectRefusal(broken, 400, 'not-json')
    const body = { email: 'a@example.com', password: 'x'.repeat(3_000_000) }
    expectRefusal(await client.send(accounts.signIn, { body }), 413, 'too-large')
  })

  it('says that the database is away, as a watcher needs to know', async () => {
    const away = openDatabase({ url: 'postgres://nobody@127.0.0.1:1/none' })
    const { app } = createTestApp({ open: { ...away, database: away.database } })
    expectRefusal(await request(app).get(service.health.path), 503, 'database-away')
    await away.close()
  })

  it('gives every answer an id of its own', async () => {
    const ids = await Promise.all(
      [1, 2].map(async () => (await request(test.app).get(service.health.path)).headers['x-request-id']),
    )
    expect(new Set(ids).size).toBe(2)
    expect(ids[0]).toMatch(/^[0-9a-f-]{36}$/)
  })
})

describe('behind a proxy that speaks TLS', () => {
  it('gives the cookie a name and flags that no other site or connection can use', async () => {
    const config = { secureCookies: true, trustProxy: true, publicUrl: 'https://book.example.com' }
    const { app } = createTestApp({ open, config })
    const { email } = await createPerson(open.database)
    const tls = { 'X-Forwarded-Proto': 'https' }
    const before = await request(app).get(accounts.readSession.path).set(tls)
    const cookie = String(before.headers['set-cookie'])
    expect(cookie).toMatch(/^__Host-tautbook=/)
    for (const flag of ['Path=/', 'HttpOnly', 'Secure', 'SameSite=Lax']) expect(cookie).toContain(flag)
    expect(cookie).not.toContain('Domain')
    expect(before.headers['strict-transport-security']).toMatch(/max-age=\d+/)
    const answer = await request(app)
      .post(accounts.signIn.path)
      .set({
        ...tls,
        Cookie: cookie.split(';')[0]!,
        Origin: 'https://book.example.com',
        'X-CSRF-Token': (before.body as { csrfToken: string }).csrfToken,
      })
      .send({ email, password: testPassword })
    expect(answer.status, answer.text).toBe(200)
  })
})
