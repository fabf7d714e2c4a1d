import type { ReactNode } from 'react'
import type { Job } from '@shared/schemas/job'
import { Card } from '@/components/page'
import { dateText } from '@/lib/date-text'
import { Due } from './due-date'

/** What is known of a job, what is not known yet left out. */
export function JobDetails({ job }: { job: Job }) {
  const rows: [label: string, value: ReactNode][] = [
    ['Customer', job.customer],
    ['Site', job.site],
    ['With', job.personName],
    ['Due', job.due ? <Due job={job} /> : null],
    ['Opened', dateText(job.createdAt)],
    ['Notes', job.notes],
  ]
  return (
    <Card title="Details">
      <dl className="grid grid-cols-[auto_minmax(0,1fr)] gap-x-6 gap-y-2">
        {rows.map(([label, value]) =>
          value ? (
            <div key={label} className="contents">
              <dt className="text-soft">{label}</dt>
              <dd className="whitespace-pre-line">{value}</dd>
            </div>
          ) : null,
        )}
      </dl>
    </Card>
  )
}
