import { useMutation, useQueryClient } from '@tanstack/react-query'
import { surveys } from '@shared/endpoints/surveys'
import { call } from '@/lib/api-client'

/** Puts a survey away. */
export function useRemoveSurvey() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (surveyId: string) => call(surveys.removeSurvey, { params: { surveyId } }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['jobs'] }),
  })
}
