import type { SurveyChecks } from '@shared/calculation/checks/check-survey'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { LengthFormat } from '@shared/units/format-length'
import type { Figures } from './figures'

/** What every figure of the checks is written with. */
export interface CheckContext {
  checks: SurveyChecks
  rules: HouseRules
  format: LengthFormat
  figures: Figures
}
