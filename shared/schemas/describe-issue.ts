import type { z } from 'zod'

/**
 * The faults of a parsed document as sentences, one each: the path, the value found there and what was expected.
 * `input` is the document that the issues are about.
 */
export const describeIssues = (issues: readonly z.core.$ZodIssue[], input: unknown): string[] =>
  issues.flatMap(closest).flatMap((issue) => describe(issue, input))

function describe(issue: z.core.$ZodIssue, input: unknown): string[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map(
      (key) => `${formatPath([...issue.path, key])}: unknown key; remove it or correct its name`,
    )
  }
  const found = issue.code === 'invalid_key' ? issue.path.at(-1) : valueAt(input, issue.path)
  const path = issue.path.length > 0 ? formatPath(issue.path) : 'the file'
  return [`${path}: found ${showValue(found)}, expected ${expected(issue)}`]
}

/** Where a value may be of several shapes, the faults of the shape it comes closest to. */
function closest(issue: z.core.$ZodIssue): z.core.$ZodIssue[] {
  if (issue.code !== 'invalid_union' || issue.errors.length === 0) return [issue]
  const nearest = issue.errors.reduce((best, other) => (other.length < best.length ? other : best))
  return nearest.flatMap((inner) => closest({ ...inner, path: [...issue.path, ...inner.path] }))
}

/** What was expected, to stand after that word: `a number above 0`. A schema's own wording goes before ours. */
export function expected(issue: z.core.$ZodIssue): string {
  const own = /^expected (.+)$/i.exec(issue.message)?.[1]
  if (own !== undefined) return own
  switch (issue.code) {
    case 'invalid_type':
      return kinds[issue.expected] ?? `a value of the kind ${issue.expected}`
    case 'invalid_value':
      return oneOf(issue.values)
    case 'invalid_union':
      return 'options' in issue && Array.isArray(issue.options) ? oneOf(issue.options) : 'another shape'
    case 'too_small':
      return bounded(issue, { including: 'at least', beyond: 'above' }, issue.minimum)
    case 'too_big':
      return bounded(issue, { including: 'at most', beyond: 'below' }, issue.maximum)
    case 'not_multiple_of':
      return `a multiple of ${issue.divisor}`
    case 'invalid_key':
      return issue.issues[0] ? expected(issue.issues[0]) : 'another name'
    default:
      return `something else: ${issue.message}`
  }
}

const kinds: Record<string, string> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list in [ ]',
  tuple: 'a list in [ ]',
  object: 'an object in { }',
  record: 'an object in { }',
}

const oneOf = (values: readonly unknown[]): string => {
  const shown = values.map(showValue)
  return shown.length > 1 ? `one of ${shown.join(', ')}` : (shown[0] ?? 'nothing')
}

function bounded(
  { origin, inclusive }: { origin: string; inclusive?: boolean },
  words: { including: string; beyond: string },
  bound: number | bigint,
): string {
  if (origin === 'string') return `text of ${words.including} ${counted(bound, 'character')}`
  if (origin === 'array') return `a list of ${words.including} ${counted(bound, 'entry', 'entries')}`
  return `a number ${inclusive ? words.including : words.beyond} ${bound}`
}

const counted = (count: number | bigint, one: string, many = `${one}s`): string =>
  `${count} ${Number(count) === 1 ? one : many}`

const formatPath = (path: PropertyKey[]): string =>
  path
    .map((part, i) => (typeof part === 'number' ? `[${part}]` : `${i > 0 ? '.' : ''}${String(part)}`))
    .join('')

function valueAt(input: unknown, path: PropertyKey[]): unknown {
  let value = input
  for (const part of path) {
    if (typeof value !== 'object' || value === null) return undefined
    value = (value as Record<PropertyKey, unknown>)[part]
  }
  return value
}

function showValue(value: unknown): string {
  if (value === undefined) return 'nothing'
  const text = JSON.stringify(value)
  return text.length > 60 ? `${text.slice(0, 57)}…` : text
}
