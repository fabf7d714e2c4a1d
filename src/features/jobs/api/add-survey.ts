import { useMutation, useQueryClient } from '@tanstack/react-query'
import { surveys } from '@shared/endpoints/surveys'
import { call } from '@/lib/api-client'

/** Begins an empty survey in a job. */
export const useAddSurvey = (jobId: string) =>
  useMutation({
    mutationFn: (title: string) => call(surveys.createSurvey, { params: { jobId }, body: { title } }),
  })

/** Begins a survey from a survey file. */
export function useImportSurvey(jobId: string) {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (file: unknown) => call(surveys.importSurvey, { params: { jobId }, body: file }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['jobs'] }),
  })
}

/** Puts a survey away. */
export function useRemoveSurvey() {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (surveyId: string) => call(surveys.removeSurvey, { params: { surveyId } }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['jobs'] }),
  })
}
