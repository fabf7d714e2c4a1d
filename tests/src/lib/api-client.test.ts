import { z } from 'zod'
import { afterEach, beforeEach, expect, test, vi } from 'vitest'
import { endpoint } from '@shared/endpoints/endpoint'

const readJob = endpoint({
  id: 'test.read',
  method: 'GET',
  path: '/api/jobs/:jobId',
  gate: 'signed-in',
  summary: 'Reads.',
  params: z.object({ jobId: z.string() }),
  query: z.object({ search: z.string().optional(), page: z.number().optional() }),
  response: z.object({ title: z.string() }),
})
const addJob = endpoint({
  id: 'test.add',
  method: 'POST',
  path: '/api/jobs',
  gate: 'signed-in',
  summary: 'Adds.',
  body: z.object({ title: z.string() }),
})

interface Request {
  url: string
  method: string
  headers: Record<string, string>
  body: unknown
}

let requests: Request[]
let answers: (Response | Error)[]

/** The client keeps its token in the module, so each test has a module of its own. */
async function freshClient() {
  vi.resetModules()
  return import('@/lib/api-client')
}

beforeEach(() => {
  requests = []
  answers = []
  vi.stubGlobal('fetch', (url: string, { method, headers, body }: Omit<Request, 'url'>) => {
    requests.push({ url, method, headers, body })
    const answer = answers.shift() ?? new Error('The test has no further answer.')
    return answer instanceof Error ? Promise.reject(answer) : Promise.resolve(answer)
  })
})
afterEach(() => vi.unstubAllGlobals())

const json = (body: unknown, status = 200) => new Response(JSON.stringify(body), { status })
const nothing = () => new Response(null, { status: 204 })

test('fills names into the path, leaves empty search words out and answers the body', async () => {
  const { call } = await freshClient()
  answers = [json({ title: 'Back deck' })]
  const job = await call(readJob, { params: { jobId: 'a/b' }, query: { search: '', page: 2 } })
  expect(job).toEqual({ title: 'Back deck' })
  expect(requests.map(({ url }) => url)).toEqual(['/api/jobs/a%2Fb?page=2'])
  expect(requests[0]?.headers).not.toHaveProperty('x-csrf-token')
})

test('a change carries the token of the session, which is fetched once', async () => {
  const { call } = await freshClient()
  answers = [json({ csrfToken: 't1' }), nothing(), nothing()]
  await call(addJob, { body: { title: 'One' } })
  await call(addJob, { body: { title: 'Two' } })
  expect(requests.map(({ method, url }) => `${method} ${url}`)).toEqual([
    'GET /api/session',
    'POST /api/jobs',
    'POST /api/jobs',
  ])
  expect(requests[1]).toMatchObject({
    headers: { 'x-csrf-token': 't1', 'content-type': 'application/json' },
    body: '{"title":"One"}',
  })
  expect(requests[2]?.headers['x-csrf-token']).toBe('t1')
})

test('a stale page fetches a new token and tries once more, not for ever', async () => {
  const { call, keepToken } = await freshClient()
  const stale = { code: 'stale-page', detail: 'Reload the page.' }
  keepToken('old')
  answers = [json(stale, 403), json({ csrfToken: 'new' }), json(stale, 403)]
  await expect(call(addJob, { body: { title: 'One' } })).rejects.toMatchObject({ code: 'stale-page' })
  expect(requests.map(({ headers }) => headers['x-csrf-token'])).toEqual(['old', undefined, 'new'])
})

test('a refusal keeps code, status, sentence and fields', async () => {
  const { call } = await freshClient()
  const fields = [{ path: 'title', message: 'Write a title.' }]
  answers = [json({ code: 'invalid', detail: 'Look at the title.', fields }, 422)]
  await expect(call(readJob, { params: { jobId: '1' } })).rejects.toMatchObject({
    code: 'invalid',
    status: 422,
    message: 'Look at the title.',
    fields,
  })
})

test('silence is offline', async () => {
  const { call } = await freshClient()
  answers = [new TypeError('Failed to fetch')]
  await expect(call(readJob, { params: { jobId: '1' } })).rejects.toMatchObject({
    code: 'offline',
    status: 0,
  })
})

test('a signal lost in the middle of an answer is offline too', async () => {
  const { call } = await freshClient()
  const torn = new ReadableStream({ start: (stream) => stream.error(new TypeError('network error')) })
  answers = [new Response(torn)]
  await expect(call(readJob, { params: { jobId: '1' } })).rejects.toMatchObject({ code: 'offline' })
})

test.each([
  ['a page of the network itself', new Response('<html>Accept the terms</html>', { status: 200 })],
  ['a refusal in HTML', new Response('<h1>Bad gateway</h1>', { status: 502 })],
  ['a refusal of the network itself', new Response('<h1>Sign in first</h1>', { status: 403 })],
  ['a refusal in JSON of somebody else', json({ error: 'quota' }, 403)],
  ['a refusal that is null', json(null, 500)],
])('%s is not taken for the server’s word', async (_name, answer) => {
  const { call } = await freshClient()
  answers = [answer]
  await expect(call(readJob, { params: { jobId: '1' } })).rejects.toMatchObject({
    name: 'ApiError',
    code: 'unreadable',
    status: 0,
  })
})

test('a token that cannot be read stops the change before it is sent', async () => {
  const { call } = await freshClient()
  answers = [new Response('<h1>Bad gateway</h1>', { status: 502 })]
  await expect(call(addJob, { body: { title: 'One' } })).rejects.toMatchObject({
    code: 'unreadable',
  })
  expect(requests).toHaveLength(1)
})

test('what is called off stays called off and is not taken for silence', async () => {
  const { call } = await freshClient()
  const abort = new AbortController()
  abort.abort()
  answers = [new DOMException('Aborted', 'AbortError')]
  await expect(call(readJob, { params: { jobId: '1' }, signal: abort.signal })).rejects.toMatchObject({
    name: 'AbortError',
  })
})
