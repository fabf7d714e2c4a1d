import type { z } from 'zod'
import { AppError } from '../errors'
import { findUnstorable } from './unstorable'

type Part = 'params' | 'query' | 'body'

/**
 * The part of a request as its schema reads it; `undefined` where the endpoint takes none.
 * @throws AppError 400 `not-valid` with a sentence for each field.
 */
export function validate<Schema extends z.ZodType>(
  schema: Schema | undefined,
  value: unknown,
  part: Part,
): Schema extends z.ZodType ? z.output<Schema> : undefined
export function validate(schema: z.ZodType | undefined, value: unknown, part: Part): unknown {
  if (schema === undefined) return undefined
  refuseUnstorable(value)
  const parsed = schema.safeParse(value)
  if (parsed.success) return parsed.data
  const fields = parsed.error.issues.map((issue) => ({
    path: issue.path.join('.'),
    message: sentence(issue),
  }))
  // A malformed address is a thing that does not exist.
  if (part === 'params')
    throw new AppError(404, 'not-found', 'There is nothing at this address. Check the link.')
  const first = fields[0]
  const detail =
    fields.length === 1 && first
      ? `${first.path === '' ? 'The request' : first.path}: ${first.message}`
      : `${fields.length} fields need another look; each says what.`
  throw new AppError(400, 'not-valid', detail, { fields })
}

function refuseUnstorable(value: unknown): void {
  const path = findUnstorable(value)
  if (path === undefined) return
  const message = 'This text holds a character that cannot be kept. Type it again.'
  throw new AppError(400, 'not-valid', `${path === '' ? 'The request' : path}: ${message}`, {
    fields: [{ path, message }],
  })
}

const sentence = (issue: z.core.$ZodIssue): string =>
  issue.code === 'unrecognized_keys' ? `unknown key ${issue.keys.join(', ')}` : issue.message
