import { describe, expect, it } from 'vitest'
import { starterRules } from '@shared/calculation/starter-rules'
import { inches, millimetres } from '@shared/units/length'
import { ruleGroups } from '../../../../src/features/hardware/rule-list'
import { isStarting, ruleText } from '../../../../src/features/hardware/rule-values'

const inchHouse = { force: 'lbf', format: { style: 'inches', finest: 64 } } as const
const metricHouse = { force: 'N', format: { style: 'millimetres' } } as const
const rule = (key: string) => ruleGroups.flatMap(({ rules }) => rules).find((each) => each.key === key)!

describe('a rule as people read it', () => {
  it.each([
    ['cutStep', '1/16"'],
    ['trim', '4"'],
    ['tension', '150 lbf'],
    ['reserve', '15 %'],
    ['gaugeLimit', '0.25°'],
    ['tapeClass', 'II'],
    ['longestRun', 'none'],
  ])('%s starts at %s', (key, text) => {
    expect(ruleText(rule(key), starterRules, inchHouse)).toBe(text)
  })

  it('is in the units of a metric house', () => {
    expect(ruleText(rule('trim'), { ...starterRules, trim: millimetres(100) }, metricHouse)).toBe('100 mm')
    expect(ruleText(rule('tension'), starterRules, metricHouse)).toBe('667 N')
  })
})

it('knows a changed rule from one at its starting value', () => {
  const changed = { ...starterRules, trim: inches(6) }
  expect(isStarting(rule('trim'), changed, starterRules)).toBe(false)
  expect(isStarting(rule('cutStep'), changed, starterRules)).toBe(true)
})
