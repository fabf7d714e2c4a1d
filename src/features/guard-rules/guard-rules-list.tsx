import { Link } from 'react-router-dom'
import { rulesName } from '@shared/calculation/guard-rules/published-rules'
import type { GuardRules } from '@shared/schemas/guard-rules'

interface GuardRulesListProps {
  label: string
  rules: readonly GuardRules[]
  pathOf: (id: string) => string
}

/** Sets of guard rules, each leading to its page. */
export const GuardRulesList = ({ label, rules, pathOf }: GuardRulesListProps) => (
  <ul aria-label={label} className="grid gap-2 md:grid-cols-2">
    {rules.map((each) => (
      <li key={each.id}>
        <Link
          to={pathOf(each.id)}
          className="flex min-h-16 flex-col justify-center rounded border border-rule bg-card px-4 py-2 text-ink no-underline hover:border-steel"
        >
          <span className="font-medium">{rulesName(each)}</span>
          <span className="text-sm text-soft">
            {each.basedOn ? `made from ${each.basedOn}` : each.situations.map(({ name }) => name).join('; ')}
          </span>
        </Link>
      </li>
    ))}
  </ul>
)
