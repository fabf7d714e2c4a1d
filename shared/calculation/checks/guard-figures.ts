import type { Guard } from '../../schemas/guard'
import type { GuardRules, Situation } from '../../schemas/guard-rules'
import { inches } from '../../units/length'
import { findRules } from '../guard-rules/published-rules'

/** What the chosen rules ask of a guard; nm. */
export interface GuardFigures {
  guard: Guard
  /** Undefined when the survey names rules that nobody knows. */
  rules?: GuardRules
  /** The situation that was chosen, or the strictest. */
  situation?: Situation
  /** The survey does not say which situation it is. */
  assumed: boolean
  /** No sphere of this size may pass on the level, and on stairs. */
  sphere: number
  stairSphere: number
  /** The tallest riser of one step. */
  riser: number
}

/** Where no rules are known: those of IRC R312.1.3 and R311.7. */
const FALLBACK = { sphere: inches(4), riser: inches(7.75) }

/**
 * The figures that a survey's guard is held to: those of its rules, and the survey's own spheres where it gives them.
 *
 * Units: nm.
 * Source: section 8 of the calculation; each figure's section is named with the rules.
 */
export function guardFigures(guard: Guard, own: readonly GuardRules[] = []): GuardFigures {
  const rules = findRules(guard.rules, own)
  const chosen = rules?.situations.find(({ id }) => id === guard.situation)
  const sphere = guard.sphere ?? rules?.sphere.value ?? FALLBACK.sphere
  return {
    guard,
    rules,
    situation: chosen ?? (rules && strictest(rules)),
    assumed: !chosen && (rules?.situations.length ?? 0) > 1,
    sphere,
    stairSphere:
      guard.stairSphere ?? (guard.sphere === undefined ? rules?.stairSphere?.value : undefined) ?? sphere,
    riser: rules?.riser?.value ?? FALLBACK.riser,
  }
}

const strictest = ({ situations }: GuardRules): Situation | undefined =>
  [...situations].sort((a, b) => b.height.value - a.height.value)[0]
