import type { Job } from '@shared/schemas/job'
import { Link } from 'react-router-dom'
import { type Column, Table } from '@/components/table'
import { Due } from './due-date'

interface JobListProps {
  jobs: readonly Job[]
  pathOf: (jobId: string) => string
}

/** Jobs as cards on a phone and as a dense table on a desk. */
export function JobList({ jobs, pathOf }: JobListProps) {
  const columns: Column<Job>[] = [
    { key: 'number', header: 'No.', figures: true, cell: ({ number }) => number },
    {
      key: 'title',
      header: 'Job',
      cell: ({ id, title }) => (
        <Link to={pathOf(id)} className="font-medium text-spruce underline-offset-2 hover:underline">
          {title}
        </Link>
      ),
    },
    { key: 'customer', header: 'Customer', cell: ({ customer }) => customer },
    { key: 'stage', header: 'Stage', cell: ({ stage }) => stage },
    { key: 'with', header: 'With', cell: ({ personName }) => personName },
    { key: 'due', header: 'Due', cell: (job) => <Due job={job} /> },
    { key: 'surveys', header: 'Surveys', figures: true, cell: ({ surveyCount }) => surveyCount },
  ]
  return (
    <>
      <Table
        className="hidden md:block"
        caption="Jobs"
        columns={columns}
        rows={jobs}
        keyOf={({ id }) => id}
      />
      <ul className="flex flex-col gap-2 md:hidden">
        {jobs.map((job) => (
          <li key={job.id}>
            <Link to={pathOf(job.id)} className="block rounded border border-rule bg-card p-4">
              <span className="flex items-baseline justify-between gap-3">
                <span className="min-w-0 text-lg font-semibold">{job.title}</span>
                <span className="figures text-soft">{job.number}</span>
              </span>
              <span className="block text-soft">
                {[job.customer, job.personName].filter(Boolean).join(' · ')}
              </span>
              <span className="mt-1 flex flex-wrap justify-between gap-2">
                <span className="font-medium text-spruce">{job.stage}</span>
                <Due job={job} />
              </span>
            </Link>
          </li>
        ))}
      </ul>
    </>
  )
}
