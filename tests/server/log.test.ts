import express from 'express'
import { pinoHttp } from 'pino-http'
import request from 'supertest'
import { expect, it } from 'vitest'
import { createLog, loggablePath } from '../../server/log'

it('writes nothing that lets somebody in', async () => {
  const lines: string[] = []
  const log = createLog({ logLevel: 'info' }, { write: (line) => void lines.push(line) })
  const app = express()
  app.use(pinoHttp({ logger: log }))
  app.post('/api/session', (_request, response) => {
    response.set('Set-Cookie', 'session=cookie-secret').json({})
  })
  app.post('/api/invitations/:token', (_request, response) => void response.json({}))
  const secrets = {
    Cookie: 'session=cookie-secret',
    'X-CSRF-Token': 'csrf-secret',
    Authorization: 'Bearer auth-secret',
  }
  await request(app).post('/api/session?q=query-secret').set(secrets).send({ password: 'body-secret' })
  await request(app).post('/api/invitations/link-secret')
  expect(lines).toHaveLength(2)
  expect(lines.join('')).not.toContain('secret')
  expect(lines.map((line) => JSON.parse(line) as unknown)).toMatchObject([
    { level: 'info', req: { method: 'POST', url: '/api/session' } },
    { level: 'info', req: { method: 'POST', url: '/api/invitations/…' } },
  ])
})

it('hides the token of a one-time link wherever the link leads', () => {
  expect(loggablePath('/invitation/abc?x=1')).toBe('/invitation/…')
  expect(loggablePath('/api/people/42/invitation')).toBe('/api/people/42/invitation')
})
