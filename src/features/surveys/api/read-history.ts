import { infiniteQueryOptions } from '@tanstack/react-query'
import { type SurveyHistoryEntry, surveys } from '@shared/endpoints/surveys'
import { call } from '@/lib/api-client'

interface HistoryPage {
  entries: SurveyHistoryEntry[]
  next: number | null
}

/** A page of a survey's changes, the newest first. */
export const readHistory = (
  surveyId: string,
  query: { before?: number; limit?: number } = {},
  signal?: AbortSignal,
): Promise<HistoryPage> => call(surveys.readHistory, { params: { surveyId }, query, signal })

export const historyQuery = (surveyId: string) =>
  infiniteQueryOptions({
    queryKey: ['surveys', surveyId, 'history'],
    queryFn: ({ pageParam, signal }) =>
      readHistory(surveyId, pageParam === null ? {} : { before: pageParam }, signal),
    initialPageParam: null as number | null,
    getNextPageParam: ({ next }) => next,
  })
