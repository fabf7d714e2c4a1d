import { allFindings } from '@shared/calculation/all-findings'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import { cutListRows } from '@shared/cut-list/cut-list-rows'
import { fittingsToPick } from '@shared/cut-list/fittings-to-pick'
import type { Company } from '@shared/schemas/company'
import type { Database } from '../../database/client'
import type { CutListDocument } from '../../documents/cut-list-document'
import { judge } from '../../documents/judged-finding'
import { momentText } from '../../documents/moment-text'
import { readCalculationInput } from '../surveys/export-survey.service'

export interface CutListRequest {
  company: Company
  surveyId: string
  now: Date
}

/** The cut list of a survey as it stands, ready to be written as a file. */
export async function readCutList(
  database: Database,
  { company, surveyId, now }: CutListRequest,
): Promise<CutListDocument> {
  const { record, input } = await readCalculationInput(database, { companyId: company.id, surveyId })
  const result = calculateSurvey(input)
  return {
    company: company.name,
    jobNumber: record.jobNumber,
    jobTitle: record.jobTitle,
    surveyTitle: record.survey.title,
    revision: record.revision,
    made: momentText(now),
    units: record.survey.units.length,
    fraction: company.fraction,
    cutList: cutListRows(result, input),
    findings: judge(record.survey, allFindings(result, checkSurvey(input))),
    picks: fittingsToPick(result, input),
  }
}
