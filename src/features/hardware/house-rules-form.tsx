import { useState } from 'react'
import { starterRules } from '@shared/calculation/starter-rules'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { Units } from '@shared/schemas/quantities'
import type { LengthFormat } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { LengthField } from '@/components/length-field'
import { Card } from '@/components/page'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { fieldError, messageOf } from '@/lib/api-error'
import { useSaveHouseRules } from './api/save-house-rules'
import { ForceField } from './force-field'
import { NumberField } from './number-field'
import { type Rule, ruleGroups } from './rule-list'

interface HouseRulesFormProps {
  rules: HouseRules
  units: Units
  format: LengthFormat
  readOnly: boolean
}

export function HouseRulesForm({ rules: saved, units, format, readOnly }: HouseRulesFormProps) {
  const [rules, setRules] = useState(saved)
  const save = useSaveHouseRules()
  const set = (fields: Partial<HouseRules>) => setRules((now) => ({ ...now, ...fields }))
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault()
        save.mutate(rules, { onSuccess: () => sayDone('The house rules are saved.') })
      }}
    >
      <fieldset disabled={readOnly} className="flex flex-col gap-4">
        {save.error ? <ErrorNote message={messageOf(save.error)} /> : null}
        {ruleGroups.map(({ title, rules: group }) => (
          <Card key={title} title={title}>
            <div className="grid gap-5 md:grid-cols-2">
              {group.map((rule) => (
                <RuleField
                  key={rule.key}
                  rule={rule}
                  rules={rules}
                  units={units}
                  format={format}
                  error={fieldError(save.error, rule.key)}
                  onChange={set}
                />
              ))}
            </div>
          </Card>
        ))}
        {readOnly ? null : (
          <div className="flex flex-wrap gap-2">
            <Button type="submit" look="primary" busy={save.isPending}>
              Save the house rules
            </Button>
            <Button look="quiet" onClick={() => setRules(starterRules)}>
              Put the starting values in
            </Button>
          </div>
        )}
      </fieldset>
    </form>
  )
}

interface RuleFieldProps {
  rule: Rule
  rules: HouseRules
  units: Units
  format: LengthFormat
  error: string | undefined
  onChange: (fields: Partial<HouseRules>) => void
}

function RuleField({ rule, rules, units, format, error, onChange }: RuleFieldProps) {
  const { label, meaning } = rule
  if (rule.kind === 'length') {
    const keep = (value: HouseRules['cutStep'] | undefined) => {
      if (value !== undefined || rule.optional === true) onChange({ [rule.key]: value })
    }
    return (
      <LengthField
        label={label}
        hint={meaning}
        required={rule.optional !== true}
        value={rules[rule.key]}
        format={format}
        error={error}
        onChange={keep}
      />
    )
  }
  if (rule.kind === 'force') {
    return (
      <ForceField
        label={label}
        hint={meaning}
        unit={units.force}
        value={rules.tension}
        error={error}
        onChange={(tension) => tension !== undefined && onChange({ tension })}
      />
    )
  }
  if (rule.kind === 'number') {
    const share = rule.percent === true ? 100 : 1
    return (
      <NumberField
        label={label}
        hint={meaning}
        value={Number((rules[rule.key] * share).toFixed(6))}
        error={error}
        onChange={(value) => value !== undefined && onChange({ [rule.key]: value / share })}
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
