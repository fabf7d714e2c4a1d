import type { Units } from '../schemas/quantities'
import { SURVEY_VERSION, type Survey, surveySchema } from '../schemas/survey'

/** A survey with nothing measured yet, its guard at the starting values. @throws ZodError for a title empty or over 120 characters */
export const newSurvey = (title: string, units: Units): Survey =>
  surveySchema.parse({ format: 'tautbook.survey', version: SURVEY_VERSION, units, title })
