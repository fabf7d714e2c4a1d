import { z } from 'zod'
import type { Endpoint } from '@shared/endpoints/endpoint'
import { problemSchema } from '@shared/schemas/problem'

type Json = Record<string, unknown>

const SESSION = 'session'
const PROBLEM = { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } }

/** The OpenAPI 3.1 description of these endpoints: made of the very schemas that requests are checked by. */
export function describeEndpoints(endpoints: readonly Endpoint[], cookieName: string): Json {
  const paths: Record<string, Json> = {}
  for (const endpoint of endpoints) {
    const path = endpoint.path.replace(/:(\w+)/g, '{$1}')
    paths[path] = { ...paths[path], [endpoint.method.toLowerCase()]: operation(endpoint) }
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Tautbook',
      version: '1',
      description:
        'Lengths are whole nanometres, angles degrees, forces newtons. Requests that change something carry the token of `GET /api/session` in `x-csrf-token`. Refusals are problem+json with a stable `code`.',
    },
    servers: [{ url: '/' }],
    paths,
    components: {
      schemas: { Problem: toSchema(problemSchema, 'output') },
      securitySchemes: { [SESSION]: { type: 'apiKey', in: 'cookie', name: cookieName } },
    },
  }
}

function operation(endpoint: Endpoint): Json {
  const { id, summary, gate } = endpoint
  const body = requestBody(endpoint)
  return {
    operationId: id,
    summary,
    tags: [id.split('.')[0]],
    ...(gate === 'public' ? { security: [] } : { security: [{ [SESSION]: [] }] }),
    ...(gate === 'public' || gate === 'signed-in' ? {} : { description: `Needs the ability \`${gate}\`.` }),
    parameters: parameters(endpoint),
    ...(body ? { requestBody: body } : {}),
    responses: {
      [String(endpoint.status ?? (endpoint.response || endpoint.file ? 200 : 204))]: answer(endpoint),
      default: { description: 'Refused; `code` says why to programs, `detail` to people.', content: PROBLEM },
    },
  }
}

function parameters({ method, params, query }: Endpoint): Json[] {
  const token = { name: 'x-csrf-token', in: 'header', required: true, schema: { type: 'string' } }
  return [
    ...fieldsOf(params).map(({ name, schema }) => ({ name, in: 'path', required: true, schema })),
    ...fieldsOf(query).map(({ name, schema, required }) => ({ name, in: 'query', required, schema })),
    ...(method === 'GET' ? [] : [token]),
  ]
}

function fieldsOf(schema: z.ZodType | undefined): { name: string; schema: unknown; required: boolean }[] {
  if (schema === undefined) return []
  const { properties = {}, required = [] } = toSchema(schema, 'input') as {
    properties?: Json
    required?: string[]
  }
  return Object.entries(properties).map(([name, field]) => ({
    name,
    schema: field,
    required: required.includes(name),
  }))
}

function requestBody({ body, upload }: Endpoint): Json | undefined {
  if (upload === 'multipart') {
    const photo = { type: 'string', contentMediaType: 'application/octet-stream' }
    const schema = { type: 'object', properties: { photo }, required: ['photo'] }
    return { required: true, content: { 'multipart/form-data': { schema } } }
  }
  if (body === undefined) return undefined
  return { required: true, content: { 'application/json': { schema: toSchema(body, 'input') } } }
}

function answer({ response, file }: Endpoint): Json {
  if (file !== undefined) return { description: 'The file.', content: { [file]: {} } }
  if (response === undefined) return { description: 'Done.' }
  return {
    description: 'Done.',
    content: { 'application/json': { schema: toSchema(response, 'output') } },
  }
}

function toSchema(schema: z.ZodType, io: 'input' | 'output'): Json {
  // OpenAPI 3.1 is of this dialect already and names it once for the whole document.
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, { io })
  return rest
}
