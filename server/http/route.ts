import type { Request, RequestHandler, Response, Router } from 'express'
import type { z } from 'zod'
import type { Endpoint } from '@shared/endpoints/endpoint'
import { can } from '@shared/permissions/abilities'
import { notAllowed, notSignedIn } from '../errors'
import type { Services } from '../services'
import type { SignedIn } from './signed-in'
import { validate } from './validate'

type Output<Schema> = Schema extends z.ZodType ? z.output<Schema> : undefined
type Input<Schema> = Schema extends z.ZodType ? z.input<Schema> : undefined

/** What a handler gets: everything checked, nothing left to ask of Express but files and cookies. */
export interface Call<Params, Query, Body> {
  params: Params
  query: Query
  body: Body
  /** Present behind every gate but `public`. */
  person: SignedIn
  companyId: string
  services: Services
  request: Request
  response: Response
}

/**
 * Registers the handler of an endpoint. Every request passes the same checklist, in this order:
 * limit (before, in `app.ts`) → person → allowed → valid → handler, which calls a service → present.
 * A handler that answers by itself (a file) returns `undefined` after doing so.
 *
 * To add an endpoint: describe it in `shared/endpoints`, call this in the feature's `X.routes.ts`, and say in
 * `tests/server/features/X/X.endpoints.ts` what is sent and what must come of it; a test fails until all three are there.
 */
export function route<
  Params extends z.ZodType,
  Query extends z.ZodType,
  Body extends z.ZodType,
  Answer extends z.ZodType,
>(
  { router, services }: { router: Router; services: Services },
  endpoint: Endpoint<Params, Query, Body, Answer>,
  handle: (call: Call<Output<Params>, Output<Query>, Output<Body>>) => Promise<Input<Answer>>,
  before: RequestHandler[] = [],
): void {
  const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete'
  const gate: RequestHandler = (request, _response, next) => {
    requirePerson(endpoint, request.user)
    next()
  }
  const answer: RequestHandler = async (request, response) => {
    const call = {
      params: validate(endpoint.params, request.params, 'params'),
      query: validate(endpoint.query, request.query, 'query'),
      body: validate(endpoint.body, request.body, 'body'),
      // Behind `public` a handler must not look at the person; `requirePerson` vouches for all other gates.
      person: request.user as SignedIn,
      companyId: request.user?.companyId ?? '',
      services,
      request,
      response,
    }
    present({ endpoint, response, checked: services.config.mode !== 'production' }, await handle(call))
  }
  router[method](endpoint.path, gate, ...before, answer)
}

/** @throws AppError 401 without a person, 403 without the ability in their own company. */
function requirePerson(endpoint: Endpoint, person: SignedIn | undefined): void {
  if (endpoint.gate === 'public') return
  if (!person) throw notSignedIn()
  if (endpoint.gate === 'signed-in') return
  if (!can(person, endpoint.gate, person)) throw notAllowed(`${person.id} lacks ${endpoint.gate}`)
}

interface Answering {
  endpoint: Endpoint
  response: Response
  /** Whether the answer must prove that it is what the endpoint promises: everywhere but in production. */
  checked: boolean
}

function present({ endpoint, response, checked }: Answering, answer: unknown): void {
  if (response.headersSent || response.writableEnded) return
  if (endpoint.response === undefined) {
    response.status(endpoint.status ?? 204).end()
    return
  }
  if (checked) endpoint.response.parse(answer)
  response.status(endpoint.status ?? 200).json(answer)
}
