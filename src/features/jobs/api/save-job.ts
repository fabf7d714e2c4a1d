import { useMutation, useQueryClient } from '@tanstack/react-query'
import { jobs } from '@shared/endpoints/jobs'
import type { Job } from '@shared/schemas/job'
import { call } from '@/lib/api-client'

/** What the form of a job holds. */
export interface JobFields {
  title: string
  customer: string
  site: string
  due: string | null
  personId: string | null
  notes: string
}

/** Opens a job, or changes one. */
export function useSaveJob(jobId: string | undefined, onSaved: (job: Job) => void) {
  const queries = useQueryClient()
  return useMutation({
    mutationFn: (fields: JobFields) =>
      jobId === undefined
        ? call(jobs.createJob, { body: fields })
        : call(jobs.changeJob, { params: { jobId }, body: fields }),
    onSuccess: async (job) => {
      await queries.invalidateQueries({ queryKey: ['jobs'] })
      onSaved(job)
    },
  })
}
