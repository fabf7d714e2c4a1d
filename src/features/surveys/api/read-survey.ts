import { queryOptions } from '@tanstack/react-query'
import { surveys } from '@shared/endpoints/surveys'
import type { SurveyRecord } from '@shared/schemas/survey-record'
import { call } from '@/lib/api-client'

export const readSurvey = (surveyId: string, signal?: AbortSignal): Promise<SurveyRecord> =>
  call(surveys.readSurvey, { params: { surveyId }, signal })

export const surveyQuery = (surveyId: string) =>
  queryOptions({
    queryKey: ['surveys', surveyId],
    queryFn: ({ signal }) => readSurvey(surveyId, signal),
    // An editor holds its own copy and asks when it must; a page that is opened asks afresh.
    staleTime: 0,
    // Nothing is kept for the next page: it must not begin on a survey that has been changed since.
    gcTime: 0,
    refetchOnWindowFocus: false,
  })
