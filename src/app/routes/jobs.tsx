import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useSearchParams } from 'react-router-dom'
import { Button, ButtonLink } from '@/components/button'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { jobsQuery } from '@/features/jobs/api/list-jobs'
import { changeJobAddress, isFiltered, readJobAddress } from '@/features/jobs/job-address'
import { JobFilters } from '@/features/jobs/job-filters'
import { JobList } from '@/features/jobs/job-list'
import { peopleQuery } from '@/features/people/api/list-people'
import { useMay } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { useSettled } from '@/lib/use-settled'
import { paths } from '../paths'

export function Component() {
  const [address, setAddress] = useSearchParams()
  const view = readJobAddress(address)
  const search = useSettled(view.search)
  const people = useQuery(peopleQuery)
  const list = useInfiniteQuery(jobsQuery({ ...view, search }))
  const jobs = list.data?.pages.flatMap((page) => page.jobs) ?? []
  const openJob = useMay('job:create') ? (
    <ButtonLink look="primary" to={paths.newJob}>
      New job
    </ButtonLink>
  ) : null
  const empty = list.data !== undefined && jobs.length === 0
  return (
    <Page title="Jobs" actions={openJob}>
      <JobFilters
        view={view}
        people={people.data ?? []}
        onChange={(name, value) => {
          setAddress((known) => changeJobAddress(known, name, value), { replace: true })
        }}
      />
      {list.isPending ? <Loading what="the jobs" /> : null}
      {empty && isFiltered(view) ? (
        <EmptyState
          title="No job fits"
          action={<Button onClick={() => setAddress({})}>Show all jobs</Button>}
        >
          Other words, another stage or another person may find it.
        </EmptyState>
      ) : null}
      {empty && !isFiltered(view) ? (
        <EmptyState title="No jobs yet" action={openJob}>
          A job is one customer, one site, one piece of work. Open the first one, then measure it.
        </EmptyState>
      ) : null}
      {jobs.length > 0 ? <JobList jobs={jobs} pathOf={paths.job} /> : null}
      <p role="status" className="mt-2 text-sm text-soft">
        {jobs.length > 0 ? countOf(jobs.length, list.hasNextPage) : ''}
      </p>
      {list.error ? (
        <ErrorNote
          message={messageOf(list.error)}
          onRetry={() => void (list.isFetchNextPageError ? list.fetchNextPage() : list.refetch())}
        />
      ) : null}
      {list.hasNextPage ? (
        <div className="mt-4 flex justify-center">
          <Button busy={list.isFetchingNextPage} onClick={() => void list.fetchNextPage()}>
            Show more
          </Button>
        </div>
      ) : null}
    </Page>
  )
}

function countOf(shown: number, more: boolean): string {
  if (more) return `The first ${shown} jobs.`
  return shown === 1 ? '1 job.' : `${shown} jobs.`
}
