import { infiniteQueryOptions, keepPreviousData } from '@tanstack/react-query'
import { jobs } from '@shared/endpoints/jobs'
import { call } from '@/lib/api-client'
import type { JobView } from '../job-address'

/** Jobs as a view of the list asks for them, a page at a time. */
export const jobsQuery = (view: JobView) =>
  infiniteQueryOptions({
    queryKey: ['jobs', 'list', view],
    queryFn: ({ pageParam, signal }) => {
      const { search, stage, sort } = view
      const asked = {
        sort,
        ...(search.trim() ? { search: search.trim() } : {}),
        ...(stage ? { stage } : {}),
        ...(view.with ? { personId: view.with } : {}),
        ...(pageParam ? { after: pageParam } : {}),
      }
      return call(jobs.listJobs, { query: asked, signal })
    },
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
    placeholderData: keepPreviousData,
  })
