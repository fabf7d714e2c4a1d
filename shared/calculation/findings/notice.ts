import type { Finding, FindingLevel, FindingPlace } from '../../schemas/finding'
import type { Units } from '../../schemas/quantities'
import { type Phrase, writePhrase } from '../phrase'

/** What a finding says, before its numbers are written in the survey's units. */
export interface Notice {
  level: FindingLevel
  code: string
  where: FindingPlace
  phrase: Phrase
}

export const toFinding = ({ level, code, where, phrase }: Notice, units: Units): Finding => ({
  level,
  code,
  where,
  text: writePhrase(phrase, units),
})

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
