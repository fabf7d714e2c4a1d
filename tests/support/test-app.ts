import { createServer, type Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import type { Express } from 'express'
import { pino } from 'pino'
import supertest from 'supertest'
import type { Endpoint } from '@shared/endpoints/endpoint'
import { memoryPhotoStorage } from '../../server/adapters/fakes/memory-photo-storage'
import { createApp } from '../../server/app'
import { type Config, readConfig } from '../../server/config'
import type { OpenDatabase } from '../../server/database/client'
import type { Services } from '../../server/services'
import { testPassword } from '../factories/person'

/** A signed-in (or anonymous) client that carries its cookies and its token, as a browser does. */
export interface TestClient {
  agent: ReturnType<typeof supertest.agent>
  /** Sends a request to an endpoint; nothing is checked on this side. */
  send: (endpoint: Endpoint, call?: TestCall) => supertest.Test
}

export interface TestCall {
  params?: Record<string, string>
  query?: Record<string, unknown>
  body?: unknown
  /** A file for the multipart field `photo`. */
  attach?: { bytes: Buffer; name: string }
  /** Leaves the token out, or sends another. */
  csrf?: string | null
}

export interface TestApp {
  app: Express
  services: Services & { photoStorage: ReturnType<typeof memoryPhotoStorage> }
  anonymous: () => Promise<TestClient>
  signIn: (email: string, password?: string) => Promise<TestClient>
  close: () => Promise<void>
}

const testConfig = (): Config =>
  readConfig(
    {
      NODE_ENV: 'test',
      DATABASE_URL: 'postgres://nobody@127.0.0.1:1/none',
      SESSION_SECRET: 'a secret that only the tests know, long enough',
      LOG_LEVEL: 'silent',
    },
    process.cwd(),
  )

/** The whole server over a test database, with pictures in memory and a clock that stands where it is put. */
export async function createTestApp(
  open: OpenDatabase,
  { clock = () => new Date(), config = {} }: { clock?: () => Date; config?: Partial<Config> } = {},
): Promise<TestApp> {
  const services = {
    config: { ...testConfig(), ...config },
    open,
    database: open.database,
    photoStorage: memoryPhotoStorage(),
    log: pino({ level: 'silent' }),
    clock,
  }
  const app = createApp(services)
  const server = await listen(app)
  const anonymous = () => newClient(server)
  return {
    app,
    services,
    anonymous,
    signIn: async (email, password = testPassword) => {
      const client = await anonymous()
      const answer = await client.agent
        .post('/api/session')
        .set('x-csrf-token', tokens.get(client.agent) ?? '')
        .send({ email, password })
      const { csrfToken } = answer.body as { csrfToken?: string }
      if (answer.status !== 200 || !csrfToken) throw new Error(`${email} could not sign in: ${answer.text}`)
      tokens.set(client.agent, csrfToken)
      return client
    },
    close: () => new Promise((resolve) => server.close(() => resolve())),
  }
}

const tokens = new WeakMap<object, string>()

async function newClient(server: Server): Promise<TestClient> {
  const agent = supertest.agent(server)
  const answer = await agent.get('/api/session')
  tokens.set(agent, (answer.body as { csrfToken: string }).csrfToken)
  return { agent, send: (endpoint, call = {}) => send(agent, endpoint, call) }
}

function send(agent: TestClient['agent'], endpoint: Endpoint, call: TestCall): supertest.Test {
  const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) =>
    encodeURIComponent(call.params?.[name] ?? name),
  )
  const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete'
  const request = agent[method](path).query(call.query ?? {})
  const token = call.csrf === undefined ? tokens.get(agent) : call.csrf
  if (token) void request.set('x-csrf-token', token)
  if (call.attach) return request.attach('photo', call.attach.bytes, call.attach.name)
  return call.body === undefined ? request : request.send(call.body as object)
}

async function listen(app: Express): Promise<Server> {
  const server = createServer(app)
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve))
  if (!(server.address() as AddressInfo).port) throw new Error('The test server has no port.')
  return server
}
