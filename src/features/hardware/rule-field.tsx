import { useState } from 'react'
import { starterRules } from '@shared/calculation/starter-rules'
import type { HouseRules } from '@shared/schemas/house-rules'
import { Button } from '@/components/button'
import { RuleControl, type RuleControlProps } from './rule-control'
import { RuleValue } from './rule-value'
import { isStarting, ruleText } from './rule-values'

/** A rule to change, with what it was in the beginning and a way back there. */
export function RuleField(props: RuleControlProps) {
  const { rule, rules, units, onChange } = props
  // What was typed and not understood goes too: the field begins anew.
  const [begun, setBegun] = useState(0)
  const starting = ruleText(rule, starterRules, units)
  const back: Partial<HouseRules> = { [rule.key]: starterRules[rule.key] }
  return (
    <div>
      <RuleControl key={begun} {...props} />
      <div className="flex min-h-12 flex-wrap items-center gap-x-3 text-sm text-soft">
        <span>
          Starting value <RuleValue rule={rule} rules={starterRules} units={units} />
        </span>
        {isStarting(rule, rules, starterRules) ? null : (
          <Button
            look="quiet"
            aria-label={`${rule.label}: back to ${starting}`}
            onClick={() => {
              onChange(back)
              setBegun((times) => times + 1)
            }}
          >
            Back to {starting}
          </Button>
        )}
      </div>
    </div>
  )
}
