import { useMutation, useQueryClient } from '@tanstack/react-query'
import { surveys } from '@shared/endpoints/surveys'
import { call } from '@/lib/api-client'

/** Begins a survey from a survey file. */
export function useImportSurvey(jobId: string) {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (file: unknown) => call(surveys.importSurvey, { params: { jobId }, body: file }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['jobs'] }),
  })
}
