import { rulesName } from '@shared/calculation/guard-rules/published-rules'
import type { FigureSource, GuardRules } from '@shared/schemas/guard-rules'

/** Own rules to begin with, made from others; figures keep their section and basis until they are changed. */
export const ownCopy = (from: GuardRules): GuardRules => ({
  ...from,
  id: `own-${from.id}`.slice(0, 40),
  name: `${from.name}, own`.slice(0, 120),
  basedOn: rulesName(from).slice(0, 160),
})

/** A figure that was changed is the company's own, wherever it stood before. */
export const asOwn = <Value>(
  value: Value,
  before: FigureSource | undefined,
): FigureSource & { value: Value } => ({
  value,
  section: before?.section ?? 'own rule',
  basis: 'own',
})
