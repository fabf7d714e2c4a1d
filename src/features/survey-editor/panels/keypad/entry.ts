import { type ParsedLength, parseLength } from '@shared/units/parse-length'

/** What has been keyed in: feet and inches as written, and the fraction beside them. */
export interface Entry {
  body: string
  /** In 32nds of an inch; null while none has been chosen. */
  thirtySeconds: number | null
}

export const emptyEntry: Entry = { body: '', thirtySeconds: null }

export type Key =
  | { key: 'digit'; digit: string }
  | { key: 'point' }
  | { key: 'feet' }
  | { key: 'sixteenths'; count: number }
  | { key: 'half-sixteenth' }
  | { key: 'back' }
  | { key: 'clear' }
  /** Written by hand, with a keyboard or from the clipboard. */
  | { key: 'written'; text: string }

const FEET = "' "

/** The entry after a key. Digits go before the fraction, so that the order of keys does not matter. */
export function press(entry: Entry, key: Key): Entry {
  const { body, thirtySeconds } = entry
  switch (key.key) {
    case 'digit':
      // After a fraction or a unit that was typed, a key begins anew.
      return { ...entry, body: /[/⁄a-z"]|[¼-¾⅐-⅞]/i.test(body) ? key.digit : body + key.digit }
    case 'point':
      return body.includes('.') ? entry : { ...entry, body: `${body === '' ? '0' : body}.` }
    case 'feet':
      return /^\d+$/.test(body) ? { ...entry, body: body + FEET } : entry
    case 'sixteenths':
      return { ...entry, thirtySeconds: key.count === 0 ? null : key.count * 2 + ((thirtySeconds ?? 0) % 2) }
    case 'half-sixteenth': {
      const now = thirtySeconds ?? 0
      const turned = now % 2 === 0 ? now + 1 : now - 1
      return { ...entry, thirtySeconds: turned === 0 ? null : turned }
    }
    case 'back':
      if (thirtySeconds !== null) return { ...entry, thirtySeconds: null }
      return { ...entry, body: body.endsWith(FEET) ? body.slice(0, -FEET.length) : body.slice(0, -1) }
    case 'clear':
      return emptyEntry
    case 'written':
      return { body: key.text, thirtySeconds: null }
  }
}

function fractionText(thirtySeconds: number): string {
  let [numerator, denominator] = [thirtySeconds, 32]
  for (; numerator % 2 === 0; numerator /= 2) denominator /= 2
  return `${numerator}/${denominator}`
}

/** The entry as a surveyor would write it. */
export const entryText = ({ body, thirtySeconds }: Entry): string =>
  [body.trimEnd(), thirtySeconds === null ? '' : fractionText(thirtySeconds)].filter(Boolean).join(' ')

/** What the entry means; undefined while nothing has been entered. */
export function readEntry(entry: Entry, house: 'in' | 'mm'): ParsedLength | undefined {
  const text = entryText(entry)
  return text === '' ? undefined : parseLength(text, { default: house })
}
