import { findRules, rulesName } from '@shared/calculation/guard-rules/published-rules'
import { GuardRulesLine } from '@/components/guard-rules-line'
import { paths } from './paths'
import type { Loaded } from './survey-session'

/** The guard rules a survey follows, with their edition and who decides. */
export function FollowedRules({ loaded: { record, guardRules } }: { loaded: Loaded }) {
  const id = record.survey.guard.rules
  const rules = findRules(id, guardRules)
  return <GuardRulesLine name={rules && rulesName(rules)} to={paths.guardRulesOf(id)} />
}
