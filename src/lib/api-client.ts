import type { z } from 'zod'
import type { Endpoint } from '@shared/endpoints/endpoint'
import type { Problem } from '@shared/schemas/problem'
import { ApiError, offline, unreadable } from './api-error'

type Input<Schema> = Schema extends z.ZodType ? z.input<Schema> : undefined
type Output<Schema> = Schema extends z.ZodType ? z.output<Schema> : undefined

export interface Sent<Params, Query, Body> {
  params?: Params
  query?: Query
  body?: Body
  signal?: AbortSignal
}

let token: string | undefined

/** Keeps the token that requests which change something must carry; every session answer brings one. */
export const keepToken = (csrfToken: string): void => {
  token = csrfToken
}

/**
 * Calls an endpoint and answers what it answers. The server has checked both ways; here the description gives types.
 * @throws ApiError with the server's code and sentence, `offline`, or `unreadable` when something else answered.
 */
export async function call<
  Params extends z.ZodType,
  Query extends z.ZodType,
  Body extends z.ZodType,
  Answer extends z.ZodType,
>(
  { method, path }: Endpoint<Params, Query, Body, Answer>,
  sent: Sent<Input<Params>, Input<Query>, Input<Body>> = {},
): Promise<Output<Answer>> {
  const url = fillIn(path, sent.params) + search(sent.query)
  const answer = await send(url, { method, body: sent.body, signal: sent.signal })
  return (answer.status === 204 ? undefined : await readBody(answer, sent.signal)) as Output<Answer>
}

interface Request {
  method: string
  body?: unknown
  signal?: AbortSignal | undefined
}

async function send(url: string, request: Request, again = true): Promise<Response> {
  if (request.method !== 'GET' && token === undefined) await fetchToken()
  const answer = await reach(url, request)
  if (answer.ok) return answer
  const refusal = await readRefusal(answer)
  // The session has begun anew since this page was opened: fetch its token and try once more.
  if (refusal.code === 'stale-page' && again) {
    await fetchToken()
    return send(url, request, false)
  }
  throw refusal
}

async function reach(url: string, { method, body, signal }: Request): Promise<Response> {
  const isForm = body instanceof FormData
  const headers: Record<string, string> = {}
  if (token !== undefined && method !== 'GET') headers['x-csrf-token'] = token
  if (body !== undefined && !isForm) headers['content-type'] = 'application/json'
  try {
    return await fetch(url, {
      method,
      headers,
      credentials: 'same-origin',
      ...(body === undefined ? {} : { body: isForm ? body : JSON.stringify(body) }),
      ...(signal ? { signal } : {}),
    })
  } catch (error) {
    if (signal?.aborted) throw error
    throw offline()
  }
}

/** The header that a request outside `call` must carry to change something. */
export async function csrfHeader(): Promise<[name: string, value: string]> {
  if (token === undefined) await fetchToken()
  return ['x-csrf-token', token ?? '']
}

async function fetchToken(): Promise<void> {
  const answer = await reach('/api/session', { method: 'GET' })
  if (!answer.ok) throw await readRefusal(answer)
  const { csrfToken } = (await readBody(answer)) as { csrfToken: string }
  keepToken(csrfToken)
}

/** The JSON of an answer. A public network's own sign-in page answers 200 with HTML; a signal may be lost half-way. */
async function readBody(answer: Response, signal?: AbortSignal): Promise<unknown> {
  try {
    return await answer.json()
  } catch (error) {
    if (signal?.aborted) throw error
    throw error instanceof SyntaxError ? unreadable() : offline()
  }
}

/**
 * The server's refusal. What stands between may refuse in its place, and must not pass for it: what waits to be sent is
 * given up when the server says no, but kept when something else does.
 */
async function readRefusal(answer: Response): Promise<ApiError> {
  try {
    const { code, detail, fields } = ((await answer.json()) ?? {}) as Partial<Problem>
    if (typeof code !== 'string' || typeof detail !== 'string') return unreadable()
    return new ApiError(code, answer.status, detail, Array.isArray(fields) ? fields : [])
  } catch {
    return unreadable()
  }
}

/** `/api/jobs/:jobId` with its names filled in. */
function fillIn(path: string, params: unknown): string {
  const values = (params ?? {}) as Record<string, string>
  return path.replace(/:(\w+)/g, (_all, name: string) => encodeURIComponent(values[name] ?? ''))
}

function search(query: unknown): string {
  const pairs = Object.entries((query ?? {}) as Record<string, unknown>).flatMap(([key, value]) =>
    value === undefined || value === '' ? [] : [[key, String(value as string | number)]],
  )
  return pairs.length > 0 ? `?${new URLSearchParams(pairs).toString()}` : ''
}
