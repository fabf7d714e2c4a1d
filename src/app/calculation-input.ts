import type { CalculationInput } from '@shared/calculation/survey-index'
import type { Loaded } from './survey-session'

/** What a loaded survey is calculated from. */
export const inputOf = ({ record, hardware, rules, guardRules }: Loaded): CalculationInput => ({
  survey: record.survey,
  hardware,
  rules,
  guardRules,
})
