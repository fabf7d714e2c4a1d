import type { HouseRules } from '@shared/schemas/house-rules'
import { Length } from '@/components/length'
import type { Rule } from './rule-list'
import { type HouseUnits, ruleText } from './rule-values'

interface RuleValueProps {
  rule: Rule
  rules: HouseRules
  units: HouseUnits
}

/** A rule's value to read: lengths with true fractions, everything else as text with its unit. */
export function RuleValue({ rule, rules, units }: RuleValueProps) {
  const length = rule.kind === 'length' ? rules[rule.key] : undefined
  return length === undefined ? ruleText(rule, rules, units) : <Length value={length} format={units.format} />
}
