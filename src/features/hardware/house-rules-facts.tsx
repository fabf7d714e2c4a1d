import type { HouseRules } from '@shared/schemas/house-rules'
import { Card } from '@/components/page'
import { FactList } from '@/components/fact-list'
import { LumberFacts } from './lumber-rules'
import { ruleGroups } from './rule-list'
import { RuleValue } from './rule-value'
import type { HouseUnits } from './rule-values'

/** The house rules for those who may not change them. */
export const HouseRulesFacts = ({ rules, units }: { rules: HouseRules; units: HouseUnits }) => (
  <div className="flex flex-col gap-4">
    {ruleGroups.map(({ title, rules: group }) => (
      <Card key={title} title={title}>
        <FactList
          facts={group.map((rule) => ({
            label: rule.label,
            value: <RuleValue rule={rule} rules={rules} units={units} />,
            meaning: rule.meaning,
          }))}
        />
      </Card>
    ))}
    <LumberFacts lumber={rules.lumber} units={units} />
  </div>
)
