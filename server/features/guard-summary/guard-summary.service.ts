import { allFindings } from '@shared/calculation/all-findings'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import type { Company } from '@shared/schemas/company'
import type { Survey } from '@shared/schemas/survey'
import type { Database } from '../../database/client'
import type { GuardSummaryDocument } from '../../documents/guard-summary-document'
import { judge } from '../../documents/judged-finding'
import { momentText } from '../../documents/moment-text'
import { readCalculationInput } from '../surveys/export-survey.service'

export interface GuardSummaryRequest {
  company: Company
  surveyId: string
  now: Date
}

/** What an inspector is handed of a survey as it stands. */
export async function readGuardSummary(
  database: Database,
  { company, surveyId, now }: GuardSummaryRequest,
): Promise<GuardSummaryDocument> {
  const { record, input } = await readCalculationInput(database, { companyId: company.id, surveyId })
  const { survey, hardware, rules } = input
  const checks = checkSurvey(input)
  return {
    company: company.name,
    jobNumber: record.jobNumber,
    jobTitle: record.jobTitle,
    revision: record.revision,
    made: momentText(now),
    survey,
    hardware,
    rules,
    checks,
    findings: judge(survey, allFindings(calculateSurvey(input), checks)),
    measured: measuredBy(survey),
  }
}

/** Who took the readings that are not struck, and on which days. */
function measuredBy({ bays, runs }: Survey): GuardSummaryDocument['measured'] {
  const days = new Map<string, string[]>()
  for (const { by, on, struck } of [...bays, ...runs].flatMap(({ readings }) => readings)) {
    if (struck !== undefined) continue
    const name = by ?? 'somebody unnamed'
    days.set(name, [...(days.get(name) ?? []), ...(on === undefined ? [] : [on.slice(0, 10)])])
  }
  return [...days].map(([by, on]) => {
    const sorted = on.toSorted()
    return { by, from: sorted[0] ?? 'a day not noted', to: sorted.at(-1) ?? 'a day not noted' }
  })
}
