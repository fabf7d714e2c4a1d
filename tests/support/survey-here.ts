import { createSurveyRow } from '../factories/survey-record'
import { workedExample } from '../factories/worked-example'
import type { Scene } from './scene'

/** The worked example as a survey of the company here. */
export async function surveyHere({ database, here }: Scene): Promise<{ surveyId: string }> {
  const row = await createSurveyRow(database, { companyId: here.company.id, survey: workedExample().survey })
  return { surveyId: row.id }
}
