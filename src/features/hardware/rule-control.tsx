import type { HouseRules } from '@shared/schemas/house-rules'
import { Checkbox, ChoiceGroup } from '@/components/choices'
import { LengthField } from '@/components/length-field'
import { NumberField } from '@/components/number-field'
import { ForceField } from '@/components/force-field'
import { allowed, refusalAt } from '@/lib/refusal'
import type { Rule } from './rule-list'
import { type HouseUnits, shareOf, shownNumber } from './rule-values'

export interface RuleControlProps {
  rule: Rule
  rules: HouseRules
  units: HouseUnits
  error: unknown
  onChange: (fields: Partial<HouseRules>) => void
}

/** The field that a rule's kind asks for. */
export function RuleControl({ rule, rules, units, error, onChange }: RuleControlProps) {
  const { label, meaning } = rule
  if (rule.kind === 'length') {
    return (
      <LengthField
        label={label}
        hint={meaning}
        required={rule.optional !== true}
        value={rules[rule.key]}
        format={units.format}
        error={refusalAt(error, rule.key, rule.above === true ? allowed.above : allowed.zeroOrMore)}
        onChange={(value) => {
          if (value !== undefined || rule.optional === true) onChange({ [rule.key]: value })
        }}
      />
    )
  }
  if (rule.kind === 'force') {
    return (
      <ForceField
        label={label}
        hint={meaning}
        unit={units.force}
        value={rules[rule.key]}
        error={refusalAt(error, rule.key, allowed.force)}
        onChange={(value) => {
          if (value !== undefined || rule.optional === true) onChange({ [rule.key]: value })
        }}
      />
    )
  }
  if (rule.kind === 'number') {
    const { unit, most, least = 0 } = rule
    return (
      <NumberField
        label={label}
        hint={meaning}
        unit={unit}
        min={least}
        max={most}
        value={shownNumber(rule, rules)}
        error={refusalAt(error, rule.key, `Write ${least} to ${most} ${unit}.`)}
        onChange={(value) => value !== undefined && onChange({ [rule.key]: value / shareOf(rule) })}
      />
    )
  }
  if (rule.kind === 'switch') {
    return (
      <Checkbox
        label={label}
        hint={meaning}
        checked={rules[rule.key]}
        onChange={(event) => onChange({ [rule.key]: event.target.checked })}
      />
    )
  }
  return (
    <ChoiceGroup
      label={label}
      hint={meaning}
      choices={rule.choices}
      value={rules[rule.key] ?? ''}
      onChange={(value) => onChange({ [rule.key]: value === '' ? undefined : value })}
    />
  )
}
