import type { IncomingMessage } from 'node:http'
import type { Express } from 'express'
import request, { type Response, type Test } from 'supertest'
import { accounts } from '@shared/endpoints/accounts'
import type { Endpoint } from '@shared/endpoints/endpoint'
import { type PersonRow, testPassword } from '../factories/person'

/** What a request carries. */
export interface Sent {
  params?: Record<string, string>
  query?: Record<string, string | number>
  body?: object
  /** Files of a multipart form. */
  attach?: { field: string; bytes: Buffer; fileName: string; type?: string }[]
  headers?: Record<string, string>
  /** Another token than the session's, or `null` for none. */
  csrf?: string | null
}

/** A browser, so far as a server can tell: it keeps cookies and sends the token it was given. */
export interface Client {
  agent: ReturnType<typeof request.agent>
  /** Sends a request to an endpoint; nothing is checked on this side. */
  send: (endpoint: Endpoint, sent?: Sent) => Promise<Response>
}

/** Somebody who has not signed in. */
export function visitor(app: Express): Client {
  const agent = request.agent(app)
  let token: string | undefined
  const learn = ({ body }: Response): void => {
    const { csrfToken } = (body ?? {}) as { csrfToken?: unknown }
    if (typeof csrfToken === 'string') token = csrfToken
  }
  const send = async (endpoint: Endpoint, sent: Sent = {}): Promise<Response> => {
    const changes = endpoint.method !== 'GET'
    if (changes && sent.csrf === undefined && token === undefined) {
      learn(await agent.get(accounts.readSession.path))
    }
    const verb = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete'
    const test = agent[verb](addressOf(endpoint, sent)).set(sent.headers ?? {})
    const given = sent.csrf === undefined ? token : sent.csrf
    if (changes && typeof given === 'string') void test.set('x-csrf-token', given)
    const answer = await load(test, endpoint, sent)
    learn(answer)
    return answer
  }
  return { agent, send }
}

/** Somebody of `createPerson`, signed in as people do it. */
export async function signedIn(
  app: Express,
  { email }: Pick<PersonRow, 'email'>,
  password = testPassword,
): Promise<Client> {
  const client = visitor(app)
  const answer = await client.send(accounts.signIn, { body: { email, password } })
  if (answer.status !== 200) throw new Error(`${email} could not sign in: ${answer.text}`)
  return client
}

/** `/api/jobs/:jobId` with its names filled in. */
function addressOf(endpoint: Endpoint, { params = {} }: Sent): string {
  return endpoint.path.replace(/:(\w+)/g, (_all, name: string) => {
    const value = params[name]
    if (value === undefined) throw new Error(`${endpoint.id} wants ${name}.`)
    return encodeURIComponent(value)
  })
}

async function load(test: Test, endpoint: Endpoint, { query, body, attach }: Sent): Promise<Response> {
  if (query) void test.query(query)
  for (const { field, bytes, fileName, type } of attach ?? []) {
    void test.attach(field, bytes, { filename: fileName, contentType: type })
  }
  // Files are wanted as the bytes they are; refusals stay JSON.
  if (endpoint.file !== undefined && endpoint.file !== 'application/json') {
    void test.buffer(true).parse(bytesOrJson)
  }
  return attach || body === undefined ? test : test.send(body)
}

function bytesOrJson(stream: Response, done: (error: Error | null, body: unknown) => void): void {
  const incoming = stream as unknown as IncomingMessage
  const chunks: Buffer[] = []
  incoming.on('data', (chunk: Buffer) => chunks.push(Buffer.from(chunk)))
  incoming.on('end', () => {
    const bytes = Buffer.concat(chunks)
    const isJson = incoming.headers['content-type']?.includes('json') ?? false
    done(null, isJson ? (JSON.parse(bytes.toString('utf8')) as unknown) : bytes)
  })
}
