import { useState } from 'react'
import { starterRules } from '@shared/calculation/starter-rules'
import type { HouseRules } from '@shared/schemas/house-rules'
import { Button } from '@/components/button'
import { Card } from '@/components/page'
import { sayDone } from '@/components/toast'
import { useAskBeforeLeaving } from '@/components/use-ask-before-leaving'
import { useSaveHouseRules } from './api/save-house-rules'
import { LumberRules } from './lumber-rules'
import { RuleField } from './rule-field'
import { ruleGroups } from './rule-list'
import type { HouseUnits } from './rule-values'
import { SafeForm } from '@/components/safe-form'

interface HouseRulesFormProps {
  rules: HouseRules
  units: HouseUnits
}

export function HouseRulesForm({ rules: saved, units }: HouseRulesFormProps) {
  const [rules, setRules] = useState(saved)
  // Fields begin anew when all of them are set at once, so that nothing half typed stays in one.
  const [begun, setBegun] = useState(0)
  const { mutate, error, isPending } = useSaveHouseRules()
  useAskBeforeLeaving(JSON.stringify(rules) !== JSON.stringify(saved))
  const setAll = (values: HouseRules) => {
    setRules(values)
    setBegun((times) => times + 1)
  }
  const startAgain = () => {
    setAll(starterRules)
    sayDone('Every rule is at its starting value, not saved yet.', () => setAll(rules))
  }
  return (
    <SafeForm
      saveLabel="Save the house rules"
      busy={isPending}
      error={error}
      onSave={() => mutate(rules, { onSuccess: () => sayDone('The house rules are saved.') })}
    >
      {ruleGroups.map(({ title, rules: group }) => (
        <Card key={title} title={title}>
          <div className="grid gap-x-6 gap-y-3 md:grid-cols-2">
            {group.map((rule) => (
              <RuleField
                key={`${rule.key} ${begun}`}
                rule={rule}
                rules={rules}
                units={units}
                error={error}
                onChange={(fields) => setRules((now) => ({ ...now, ...fields }))}
              />
            ))}
          </div>
        </Card>
      ))}
      <LumberRules
        key={`lumber ${begun}`}
        lumber={rules.lumber}
        units={units}
        error={error}
        onChange={(lumber) => setRules((now) => ({ ...now, lumber }))}
      />
      <Button className="self-start" onClick={startAgain}>
        Put all starting values in
      </Button>
    </SafeForm>
  )
}
