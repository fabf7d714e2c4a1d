import { holds } from '@shared/permissions/abilities'
import type { Role } from '@shared/permissions/roles'
import type { SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'
import { mayBeOverruled } from '@shared/survey/overrule'
import { stepsOf } from './known-readings'
import { cannotBeOverruled, mayNotOverrule } from './surveys.errors'

/** Who sends a change, and when it came in. */
export interface Sender {
  person: { name: string; roles: readonly Role[] }
  now: Date
}

/**
 * Writes who and when on every overrule of a *stop*; a safety stop is let pass, and made to stand again, only by those
 * who answer for it.
 * @throws AppError `may-not-overrule`, `cannot-be-overruled`
 */
export function stampOverrules(operation: SurveyOperation, sender: Sender): SurveyOperation {
  if (!stepsOf(operation).some(isOverruling)) return operation
  if (!holds(sender.person.roles, 'finding:overrule')) throw mayNotOverrule()
  if (operation.type !== 'group') return stampStep(operation, sender)
  return { ...operation, operations: operation.operations.map((step) => stampStep(step, sender)) }
}

const isOverruling = ({ type }: SimpleOperation): boolean =>
  type === 'stop.overrule' || type === 'stop.uphold'

function stampStep(step: SimpleOperation, { person, now }: Sender): SimpleOperation {
  if (step.type !== 'stop.overrule') return step
  if (!mayBeOverruled(step.overrule)) throw cannotBeOverruled()
  return { ...step, overrule: { ...step.overrule, by: person.name, on: now.toISOString() } }
}
