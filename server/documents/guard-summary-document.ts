import type { SurveyChecks } from '@shared/calculation/checks/check-survey'
import type { Hardware } from '@shared/schemas/hardware'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { Survey } from '@shared/schemas/survey'
import type { JudgedFinding } from './judged-finding'

/** All that the inspector's page says. */
export interface GuardSummaryDocument {
  company: string
  jobNumber: number
  jobTitle: string
  revision: number
  /** When it was made, `2026-05-14 10:12 UTC`. */
  made: string
  survey: Survey
  hardware: Hardware
  rules: HouseRules
  checks: SurveyChecks
  /** All findings, the gravest first. */
  findings: JudgedFinding[]
  /** Who took the readings that count, and from when to when, `2026-05-04`. */
  measured: { by: string; from: string; to: string }[]
}
