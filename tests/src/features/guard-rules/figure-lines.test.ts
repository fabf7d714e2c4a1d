import { expect, it } from 'vitest'
import { ibc2021 } from '@shared/calculation/guard-rules/ibc'
import { nbc2020 } from '@shared/calculation/guard-rules/nbc'
import { publishedRules } from '@shared/calculation/guard-rules/published-rules'
import { writePhrase } from '@shared/calculation/phrase'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { figureLines } from '../../../../src/features/guard-rules/figure-lines'

/** Everything in rules that has a section and is no note. */
const sources = (value: unknown): unknown[] => {
  if (typeof value !== 'object' || value === null) return []
  if ('section' in value) return [value]
  return Object.entries(value).flatMap(([key, inner]) => (key === 'notes' ? [] : sources(inner)))
}

it.each(publishedRules)('shows every figure of $name $edition, each once', (rules) => {
  const shown = figureLines(rules).map(({ source }) => source)
  expect(new Set(shown)).toEqual(new Set(sources(rules)))
  expect(shown).toHaveLength(sources(rules).length)
})

it('says figures with their lengths and forces, in the units of the rules', () => {
  const line = (rules: GuardRules, what: string) => {
    const said = figureLines(rules).find((each) => writePhrase(each.what, rules.units) === what)
    return said && writePhrase(said.value, rules.units)
  }
  expect(line(nbc2020, 'No sphere may pass of')).toBe('100 mm')
  expect(line(nbc2020, 'Load on the infill, on a square of 300 mm')).toBe('500 N')
  expect(line(nbc2020, 'Nothing climbable, at a fall over 4200 mm')).toBe('140 mm to 900 mm')
  expect(line(ibc2021, 'Above 36 in no sphere may pass of')).toBe('4 3/8 in')
  expect(line(ibc2021, 'Load at any point of the top')).toBe('200 lbf')
})
