import { findRules, publishedRules, rulesName } from '@shared/calculation/guard-rules/published-rules'
import type { Guard } from '@shared/schemas/guard'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { SelectField } from '@/components/field'
import type { EditorView } from '../model/editor-context'

interface RulesSelectProps {
  view: EditorView
  onChoose: (fields: Pick<Guard, 'rules' | 'situation'>) => void
}

/** Published and own guard rules by name and edition; retired ones only where the survey follows them. */
export function RulesSelect({ view, onChoose }: RulesSelectProps) {
  const { guardRules, retiredRules, canEdit } = view
  const { guard } = view.survey
  const own = guardRules.filter(({ id }) => !retiredRules.has(id) || id === guard.rules)
  const isKnown = findRules(guard.rules, guardRules) !== undefined
  const choose = (id: string) => {
    const situations = findRules(id, guardRules)?.situations ?? []
    const keeps = situations.some((situation) => situation.id === guard.situation)
    onChoose({ rules: id, ...(guard.situation === undefined || keeps ? {} : { situation: undefined }) })
  }
  const option = (rules: GuardRules) => (
    <option key={rules.id} value={rules.id}>
      {rulesName(rules)}
      {retiredRules.has(rules.id) ? ' (retired)' : ''}
    </option>
  )
  return (
    <SelectField
      label="Rules followed"
      value={guard.rules}
      disabled={!canEdit}
      error={isKnown ? undefined : 'These rules are not known here. Choose the ones that apply.'}
      onChange={(event) => choose(event.target.value)}
    >
      {isKnown ? null : <option value={guard.rules}>{guard.rules}</option>}
      {own.length > 0 ? <optgroup label="Own rules">{own.map(option)}</optgroup> : null}
      <optgroup label="Published rules">{publishedRules.map(option)}</optgroup>
    </SelectField>
  )
}
