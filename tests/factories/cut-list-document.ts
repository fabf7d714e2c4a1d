import { calculateSurvey } from '@shared/calculation/calculate-survey'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { cutListRows } from '@shared/cut-list/cut-list-rows'
import { fittingsToPick } from '@shared/cut-list/fittings-to-pick'
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
    date: '2026-05-14',
    units: input.survey.units.length,
    fraction: 16,
    cutList: cutListRows(result, input),
    picks: fittingsToPick(result, input),
    ...changes,
  }
}
