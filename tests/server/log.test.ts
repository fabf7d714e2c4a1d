import express from 'express'
import request from 'supertest'
import { expect, it } from 'vitest'
import { requestLog } from '../../server/http/request-log'
import { createLog, loggablePath } from '../../server/log'

function listeningLog() {
  const lines: string[] = []
  const log = createLog({ logLevel: 'info' }, { write: (line) => void lines.push(line) })
  return { log, lines }
}

it('writes nothing of a request that lets somebody in', async () => {
  const { log, lines } = listeningLog()
  const app = express()
  app.use(requestLog(log), express.json())
  app.post('/api/session', (_request, response) => {
    response.set('Set-Cookie', 'session=cookie-secret').json({})
  })
  app.post('/api/invitations/:token', (_request, response) => void response.json({}))
  const secrets = {
    Cookie: 'session=cookie-secret',
    'X-CSRF-Token': 'csrf-secret',
    Authorization: 'Bearer auth-secret',
  }
  const answer = await request(app)
    .post('/api/session?q=query-secret')
    .set(secrets)
    .send({ password: 'body-secret' })
  await request(app).post('/api/invitations/link-secret')
  await expect.poll(() => lines.length).toBe(2)
  expect(lines.join('')).not.toContain('secret')
  expect(lines.map((line) => JSON.parse(line) as unknown)).toMatchObject([
    { level: 'info', id: answer.headers['x-request-id'], method: 'POST', path: '/api/session', status: 200 },
    { level: 'info', method: 'POST', path: '/api/invitations/…' },
  ])
})

it('hides what lets somebody in even where it is handed to the log', () => {
  const { log, lines } = listeningLog()
  log.info({
    password: 'secret',
    body: { token: 'secret', csrf: 'secret' },
    req: { headers: { cookie: 'secret' } },
  })
  log.info({ authorization: 'secret', session: { csrfToken: 'secret' } })
  expect(lines).toHaveLength(2)
  expect(lines.join('')).not.toContain('secret')
})

it('hides the token of a one-time link wherever the link leads', () => {
  expect(loggablePath('/invite/abc?x=1')).toBe('/invite/…')
  expect(loggablePath('/invitation/abc?x=1')).toBe('/invitation/…')
  expect(loggablePath('/api/people/42/invitation')).toBe('/api/people/42/invitation')
})
