import { useQuery } from '@tanstack/react-query'
import { Link, useNavigate } from 'react-router-dom'
import { Page } from '@/components/page'
import { EmptyState } from '@/components/states'
import { JobForm } from '@/features/jobs/job-form'
import { peopleQuery } from '@/features/people/api/list-people'
import { useMay } from '@/features/session/session'
import { paths } from '../paths'

export function Component() {
  const people = useQuery(peopleQuery)
  const navigate = useNavigate()
  const may = useMay('job:create')
  return (
    <Page
      title="New job"
      width="narrow"
      above={
        <Link to={paths.jobs} className="inline-block py-1 font-medium text-spruce underline">
          Jobs
        </Link>
      }
    >
      {may ? (
        <JobForm people={people.data ?? []} onSaved={({ id }) => void navigate(paths.job(id))} />
      ) : (
        <EmptyState title="Your roles do not open jobs">Ask an owner, an estimator or a surveyor.</EmptyState>
      )}
    </Page>
  )
}
