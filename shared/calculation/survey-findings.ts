import type { Finding } from '../schemas/finding'
import { allFindings } from './all-findings'
import { calculateSurvey } from './calculate-survey'
import { checkSurvey } from './checks/check-survey'
import type { CalculationInput } from './survey-index'

/** Everything noticed about a survey as it stands, the gravest first. */
export const surveyFindings = (input: CalculationInput): Finding[] =>
  allFindings(calculateSurvey(input), checkSurvey(input))
