/** A NUL, or half of a surrogate pair: text that PostgreSQL cannot keep, and that nobody types. */
const unstorable = /\0|\p{Surrogate}/u

/** Nothing anybody sends is nested so deep; what is would exhaust whoever walks through it. */
const DEEPEST = 50

/** The path of the first text, or key, in a value that cannot be stored; undefined when all can. */
export function findUnstorable(value: unknown, path: string[] = []): string | undefined {
  if (typeof value === 'string') return unstorable.test(value) ? path.join('.') : undefined
  if (typeof value !== 'object' || value === null) return undefined
  if (path.length > DEEPEST) return path.slice(0, 5).join('.')
  for (const [key, inner] of Object.entries(value)) {
    if (unstorable.test(key)) return path.join('.')
    const found = findUnstorable(inner, [...path, key])
    if (found !== undefined) return found
  }
  return undefined
}
