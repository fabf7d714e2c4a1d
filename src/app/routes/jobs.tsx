import { useInfiniteQuery, useQuery } from '@tanstack/react-query'
import { useDeferredValue } from 'react'
import { useSearchParams } from 'react-router-dom'
import type { Stage } from '@shared/schemas/job'
import { Button, ButtonLink } from '@/components/button'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { jobsQuery } from '@/features/jobs/api/list-jobs'
import { JobFilters } from '@/features/jobs/job-filters'
import { JobList } from '@/features/jobs/job-list'
import { peopleQuery } from '@/features/people/api/list-people'
import { useMay } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { paths } from '../paths'

export function Component() {
  const [search, setSearch] = useSearchParams()
  const values = {
    search: search.get('search') ?? '',
    stage: search.get('stage') ?? '',
    personId: search.get('with') ?? '',
    sort: search.get('sort') ?? 'updated',
  }
  const words = useDeferredValue(values.search)
  const mayOpen = useMay('job:create')
  const people = useQuery(peopleQuery)
  const list = useInfiniteQuery(
    jobsQuery({
      ...(words ? { search: words } : {}),
      ...(values.stage ? { stage: values.stage as Stage } : {}),
      ...(values.personId ? { personId: values.personId } : {}),
      sort: values.sort as 'updated' | 'due' | 'number',
    }),
  )
  const filter = (name: keyof typeof values, value: string) =>
    setSearch(
      (known) => {
        const key = name === 'personId' ? 'with' : name
        if (value === '' || (name === 'sort' && value === 'updated')) known.delete(key)
        else known.set(key, value)
        return known
      },
      { replace: true },
    )
  const jobs = list.data?.pages.flatMap((page) => page.jobs) ?? []
  const filtered = values.search !== '' || values.stage !== '' || values.personId !== ''
  const openJob = mayOpen ? (
    <ButtonLink look="primary" to={paths.newJob}>
      New job
    </ButtonLink>
  ) : null
  return (
    <Page title="Jobs" actions={openJob}>
      <JobFilters values={values} people={people.data ?? []} onChange={filter} />
      {list.isPending ? <Loading what="the jobs" /> : null}
      {list.error ? <ErrorNote message={messageOf(list.error)} onRetry={() => void list.refetch()} /> : null}
      {list.data && jobs.length === 0 ? (
        filtered ? (
          <EmptyState
            title="No job fits"
            action={<Button onClick={() => setSearch({})}>Show all jobs</Button>}
          >
            Other words, another stage or another person may find it.
          </EmptyState>
        ) : (
          <EmptyState title="No jobs yet" action={openJob}>
            A job is one customer, one site, one piece of work. Open the first one, then measure it.
          </EmptyState>
        )
      ) : null}
      {jobs.length > 0 ? <JobList jobs={jobs} pathOf={paths.job} /> : null}
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
