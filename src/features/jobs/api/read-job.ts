import { queryOptions } from '@tanstack/react-query'
import { jobs } from '@shared/endpoints/jobs'
import { call } from '@/lib/api-client'

/** One job and its surveys. */
export const jobQuery = (jobId: string) =>
  queryOptions({
    queryKey: ['jobs', 'one', jobId],
    queryFn: ({ signal }) => call(jobs.readJob, { params: { jobId }, signal }),
    staleTime: 0,
  })
