import { ApiError, fieldError, messageOf } from '@/lib/api-error'

/**
 * What to say at a field that the server has refused. A schema's refusal speaks of numbers as they are stored, so the
 * form's own sentence stands in for it; any other refusal of the server is a sentence already.
 */
export function refusalAt(error: unknown, path: string, allowed: string): string | undefined {
  const said = fieldError(error, path)
  if (said === undefined) return undefined
  return error instanceof ApiError && error.code === 'not-valid' ? allowed : said
}

/** What happened, what was kept and what to do, above a form that was not saved. */
export function whyNotSaved(error: unknown): string {
  if (!(error instanceof ApiError) || error.fields.length === 0) return messageOf(error)
  const fields = error.fields.length === 1 ? 'One field needs' : `${error.fields.length} fields need`
  return `Nothing was saved yet, and what you typed is still here. ${fields} another look.`
}

export const allowed = {
  above: 'Write a length above zero.',
  zeroOrMore: 'Write a length of zero or more.',
  any: 'Write a length of less than 1 km.',
  force: 'Write a force above zero.',
  id: 'Write 1 to 40 letters, digits, dots, dashes or underscores, beginning with a letter or digit.',
  name: 'Write a name of up to 120 characters.',
  price: 'Write a price of zero or more.',
} as const
