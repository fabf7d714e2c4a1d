import type { Finding, FindingLevel, FindingPlace } from '../../schemas/finding'
import type { Units } from '../../schemas/quantities'
import { type Phrase, writePhrase } from '../phrase'

/** What a finding says, before its numbers are written in the survey's units. */
export interface Notice {
  level: FindingLevel
  code: string
  where: FindingPlace
  phrase: Phrase
  /** The published or house rule behind it. */
  rule?: string
}

/** Findings whose rule is the house's, by code. */
const houseRules: Readonly<Record<string, string>> = {
  'readings-differ': 'House rules: reading limit',
  'post-out-of-plumb': 'House rules: plumb limit',
  'pitch-changes': 'House rules: largest bend',
  'wide-bay': 'House rules: wide bay',
  'push-low': 'House rules: least push',
  'corner-overlap': 'House rules: corner overlap, corner web',
  'bodies-meet': 'House rules: corner web',
  'edge-thin': 'House rules: edge wall',
  'post-overstressed': 'House rules: lumber',
  'post-top-load': 'House rules: lumber',
}

export function toFinding(
  { level, code, where, phrase, rule = houseRules[code] }: Notice,
  units: Units,
): Finding {
  const text = writePhrase(phrase, units)
  return rule === undefined ? { level, code, where, text } : { level, code, where, text, rule }
}

/** "1, 2 and 5", with stretches of neighbours as "1 to 4". */
export function cableNumbers(numbers: readonly number[]): string {
  const parts: string[] = []
  for (let i = 0; i < numbers.length;) {
    let j = i
    while (numbers[j + 1] === (numbers[j] ?? 0) + 1) j += 1
    parts.push(j > i + 1 ? `${numbers[i]} to ${numbers[j]}` : numbers.slice(i, j + 1).join(', '))
    i = j + 1
  }
  return `cable${numbers.length > 1 ? 's' : ''} ${parts.join(', ')}`
}
