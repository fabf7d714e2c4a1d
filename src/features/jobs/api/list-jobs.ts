import { infiniteQueryOptions, keepPreviousData } from '@tanstack/react-query'
import { jobs } from '@shared/endpoints/jobs'
import type { Stage } from '@shared/schemas/job'
import { call } from '@/lib/api-client'

export interface JobFilter {
  search?: string
  stage?: Stage
  personId?: string
  sort?: 'updated' | 'due' | 'number'
}

export const jobsQuery = (filter: JobFilter) =>
  infiniteQueryOptions({
    queryKey: ['jobs', 'list', filter],
    queryFn: ({ pageParam, signal }) =>
      call(jobs.listJobs, { query: { ...filter, ...(pageParam ? { after: pageParam } : {}) }, signal }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
    placeholderData: keepPreviousData,
  })
