import { rulesName } from '@shared/calculation/guard-rules/published-rules'
import type { FigureSource, GuardRules } from '@shared/schemas/guard-rules'

/**
 * Own rules to begin with, made from others, under an id that none of the `own` has; figures keep their section and basis
 * until they are changed.
 */
export const ownCopy = (from: GuardRules, own: readonly Pick<GuardRules, 'id'>[]): GuardRules => ({
  ...from,
  id: freeId(`own-${from.id}`.slice(0, LONGEST_ID), new Set(own.map(({ id }) => id))),
  name: `${from.name}, own`.slice(0, 120),
  basedOn: rulesName(from).slice(0, 160),
})

const LONGEST_ID = 40

function freeId(wanted: string, taken: ReadonlySet<string>): string {
  let id = wanted
  for (let number = 2; taken.has(id); number += 1) {
    const end = `-${number}`
    id = `${wanted.slice(0, LONGEST_ID - end.length)}${end}`
  }
  return id
}

/** A figure that was changed is the company's own, wherever it stood before. */
export const asOwn = <Value>(
  value: Value,
  before: FigureSource | undefined,
): FigureSource & { value: Value } => ({
  value,
  section: before?.section ?? 'own rule',
  basis: 'own',
})
