import { useMutation, useQueryClient } from '@tanstack/react-query'
import { surveys } from '@shared/endpoints/surveys'
import { call } from '@/lib/api-client'

/** Begins an empty survey in a job. */
export function useAddSurvey(jobId: string) {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (title: string) => call(surveys.createSurvey, { params: { jobId }, body: { title } }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['jobs'] }),
  })
}
