import type { z } from 'zod'
import type { Endpoint } from '@shared/endpoints/endpoint'
import type { Problem } from '@shared/schemas/problem'
import { ApiError, offline } from './api-error'

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
 * @throws ApiError with the server's code and sentence, or `offline`.
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
  return (answer.status === 204 ? undefined : await answer.json()) as Output<Answer>
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
  const problem = await readProblem(answer)
  // The session has begun anew since this page was opened: fetch its token and try once more.
  if (problem.code === 'stale-page' && again) {
    await fetchToken()
    return send(url, request, false)
  }
  throw new ApiError(problem.code, answer.status, problem.detail, problem.fields)
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
  const { csrfToken } = (await answer.json()) as { csrfToken: string }
  keepToken(csrfToken)
}

async function readProblem(answer: Response): Promise<Pick<Problem, 'code' | 'detail' | 'fields'>> {
  try {
    return (await answer.json()) as Problem
  } catch {
    return {
      code: 'failed',
      detail: 'The server gave no readable answer. Nothing was saved; try again in a moment.',
    }
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
