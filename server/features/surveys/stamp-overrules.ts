import { holds } from '@shared/permissions/abilities'
import type { Role } from '@shared/permissions/roles'
import type { SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'
import { stepsOf } from './known-readings'
import { mayNotOverrule } from './surveys.errors'

/** Who sends a change, and when it came in. */
export interface Sender {
  person: { name: string; roles: readonly Role[] }
  now: Date
}

/**
 * Writes who and when on every overrule of a *stop*; a safety stop is let pass, and made to stand again, only by those
 * who answer for it.
 * @throws AppError `may-not-overrule`
 */
export function stampOverrules(operation: SurveyOperation, sender: Sender): SurveyOperation {
  if (!stepsOf(operation).some(isOverruling)) return operation
  if (!holds(sender.person.roles, 'finding:overrule')) throw mayNotOverrule()
  if (operation.type !== 'group') return stampStep(operation, sender)
  return { ...operation, operations: operation.operations.map((step) => stampStep(step, sender)) }
}

const isOverruling = ({ type }: SimpleOperation): boolean =>
  type === 'stop.overrule' || type === 'stop.uphold'

const stampStep = (step: SimpleOperation, { person, now }: Sender): SimpleOperation =>
  step.type === 'stop.overrule'
    ? { ...step, overrule: { ...step.overrule, by: person.name, on: now.toISOString() } }
    : step
