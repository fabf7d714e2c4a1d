import type { z } from 'zod'
import type { Ability } from '../permissions/abilities'

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE'

/** Who may call: anybody, anybody signed in, or a holder of an ability in the company that owns the thing. */
export type Gate = 'public' | 'signed-in' | Ability

/**
 * One HTTP endpoint, as both sides see it: the server validates and answers by it, the client calls by it and the
 * OpenAPI description is made of it.
 */
export interface Endpoint<
  Params extends z.ZodType = z.ZodType,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Response extends z.ZodType = z.ZodType,
> {
  /** Unique name, used as the operation id: `job.list`. */
  id: string
  method: Method
  /** With `:name` for each parameter, below `/api`. */
  path: `/api/${string}`
  gate: Gate
  /** One sentence for the description. */
  summary: string
  params?: Params
  query?: Query
  body?: Body
  response?: Response
  /** Status of the answer when all is well; 200 with a body, 204 without, unless said. */
  status?: 200 | 201 | 204
  /** What the request carries where it is not JSON. */
  upload?: 'multipart'
  /** Media type of the answer where it is a file. */
  file?: string
}

export const endpoint = <
  Params extends z.ZodType = z.ZodUndefined,
  Query extends z.ZodType = z.ZodUndefined,
  Body extends z.ZodType = z.ZodUndefined,
  Response extends z.ZodType = z.ZodUndefined,
>(
  definition: Endpoint<Params, Query, Body, Response>,
): Endpoint<Params, Query, Body, Response> => definition
