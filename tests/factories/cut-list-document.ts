import { allFindings } from '@shared/calculation/all-findings'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { cutListRows } from '@shared/cut-list/cut-list-rows'
import { fittingsToPick } from '@shared/cut-list/fittings-to-pick'
import { judge } from '../../server/documents/judged-finding'
import type { CutListDocument } from '../../server/documents/cut-list-document'

/** The cut list of a calculation's input, ready to be written as a file. */
export function cutListDocument(
  input: CalculationInput,
  changes: Partial<CutListDocument> = {},
): CutListDocument {
  const result = calculateSurvey(input)
  return {
    company: 'Marlow Lane Rail Shop',
    jobNumber: 1042,
    jobTitle: 'Back deck',
    surveyTitle: input.survey.title,
    revision: 7,
    made: '2026-05-14 10:12 UTC',
    units: input.survey.units.length,
    fraction: 16,
    cutList: cutListRows(result, input),
    findings: judge(input.survey, allFindings(result, checkSurvey(input))),
    picks: fittingsToPick(result, input),
    ...changes,
  }
}
