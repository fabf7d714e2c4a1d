import { type SurveyChange, surveys } from '@shared/endpoints/surveys'
import { call } from '@/lib/api-client'

/** Sends changes made on a revision; answers the revision they made. */
export const changeSurvey = (
  surveyId: string,
  body: { revision: number; changes: SurveyChange[] },
): Promise<{ revision: number }> => call(surveys.changeSurvey, { params: { surveyId }, body })
