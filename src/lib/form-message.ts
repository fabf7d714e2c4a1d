import { ApiError, messageOf } from './api-error'

/** What a form has to say of a refusal beside its fields; nothing when every fault already stands at one of them. */
export function formMessage(error: unknown, fields: readonly string[]): string | undefined {
  if (!error) return undefined
  const faults = error instanceof ApiError ? error.fields : []
  const allShown = faults.length > 0 && faults.every(({ path }) => fields.includes(path))
  return allShown ? undefined : messageOf(error)
}
