import { useMutation, useQueryClient } from '@tanstack/react-query'
import { jobs } from '@shared/endpoints/jobs'
import type { Stage } from '@shared/schemas/job'
import { call } from '@/lib/api-client'

/** Moves a job to another stage. */
export function useMoveJob(jobId: string) {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (stage: Stage) => call(jobs.moveJob, { params: { jobId }, body: { stage } }),
    onSuccess: () => queries.invalidateQueries({ queryKey: ['jobs'] }),
  })
}
