import { allFindings } from '@shared/calculation/all-findings'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import type { CalculationInput } from '@shared/calculation/survey-index'
import type { GuardSummaryDocument } from '../../server/documents/guard-summary-document'
import { judge } from '../../server/documents/judged-finding'

/** The guard summary of a calculation's input, ready to be printed. */
export function guardSummaryDocument(
  input: CalculationInput,
  changes: Partial<GuardSummaryDocument> = {},
): GuardSummaryDocument {
  const { survey, hardware, rules } = input
  const checks = checkSurvey(input)
  return {
    company: 'Marlow Lane Rail Shop',
    jobNumber: 1042,
    jobTitle: 'Back deck',
    revision: 7,
    made: '2026-05-14 10:12 UTC',
    survey,
    hardware,
    rules,
    checks,
    findings: judge(survey, allFindings(calculateSurvey(input), checks)),
    measured: [{ by: 'Imre', from: '2026-05-04', to: '2026-05-05' }],
    ...changes,
  }
}
