import type { Job } from '@shared/schemas/job'
import { classes } from '@/components/classes'
import { dateText } from '@/lib/date-text'
import { daysUntil, dueWords } from './due'

/** A job's due date, and in words how far off it is; a finished job's date is no longer waited for. */
export function Due({ job: { due, stage } }: { job: Pick<Job, 'due' | 'stage'> }) {
  if (!due) return null
  if (stage === 'done' || stage === 'lost') return <span className="whitespace-nowrap">{dateText(due)}</span>
  const today = new Date()
  return (
    <span className={classes('whitespace-nowrap', daysUntil(due, today) < 0 && 'font-medium text-marker')}>
      {dateText(due)} <span className="text-sm">({dueWords(due, today)})</span>
    </span>
  )
}
