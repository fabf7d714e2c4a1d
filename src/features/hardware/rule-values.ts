import type { HouseRules } from '@shared/schemas/house-rules'
import type { Units } from '@shared/schemas/quantities'
import { type LengthFormat, writeLength } from '@shared/units/format-length'
import type { Rule } from './rule-list'
import { forceText } from './words'

export interface HouseUnits {
  force: Units['force']
  format: LengthFormat
}

/** What a number rule is written as: degrees as they are, shares in per cent. */
export const shownNumber = (rule: Extract<Rule, { kind: 'number' }>, rules: HouseRules): number =>
  Number((rules[rule.key] * shareOf(rule)).toFixed(6))

export const shareOf = ({ unit }: Extract<Rule, { kind: 'number' }>): number => (unit === '%' ? 100 : 1)

/** A rule's value as people read it, with its unit. */
export function ruleText(rule: Rule, rules: HouseRules, { force, format }: HouseUnits): string {
  if (rule.kind === 'length') {
    const value = rules[rule.key]
    return value === undefined ? 'none' : writeLength(value, format)
  }
  if (rule.kind === 'force') {
    const value = rules[rule.key]
    return value === undefined ? 'none' : forceText(value, force)
  }
  if (rule.kind === 'switch') return rules[rule.key] ? 'yes' : 'no'
  if (rule.kind === 'number') {
    const number = shownNumber(rule, rules)
    return rule.unit === '°' ? `${number}°` : `${number} ${rule.unit}`
  }
  const value = rules[rule.key] ?? ''
  return rule.choices.find((choice) => choice.value === value)?.label ?? value
}

/** Whether a rule stands as it did in the beginning. */
export const isStarting = (rule: Rule, rules: HouseRules, starting: HouseRules): boolean =>
  rules[rule.key] === starting[rule.key]
