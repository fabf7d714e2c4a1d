import type { z } from 'zod'
import type { Job, jobChangesSchema, jobFieldsSchema, jobListQuerySchema, Stage } from '@shared/schemas/job'
import type { SurveySummary } from '@shared/schemas/survey-record'
import type { Database, OpenDatabase } from '../../database/client'
import { listJobSurveys } from '../surveys/surveys.service'
import { readCursor, writeCursor } from './job-page'
import { noSuchJob, notAPerson } from './jobs.errors'
import {
  insertJob,
  isActivePerson,
  type JobChanges,
  type JobKey,
  jobPageFinder,
  selectJob,
  takeJobNumber,
  updateJob,
} from './jobs.queries'

interface ListRequest {
  companyId: string
  query: z.output<typeof jobListQuerySchema>
}

/** What follows more words than these is not looked at. */
const MOST_WORDS = 10

type JobLister = (request: ListRequest) => Promise<{ jobs: Job[]; next: string | null }>

/** Answers with a page of the company's jobs, and where the next page begins. */
export function jobLister(open: OpenDatabase): JobLister {
  const findPage = jobPageFinder(open)
  return async ({ companyId, query: { search = '', after, limit, sort, ...filter } }) => {
    const rows = await findPage({
      ...filter,
      companyId,
      words: search.split(/\s+/, MOST_WORDS).filter((word) => word !== ''),
      sort,
      after: after === undefined ? undefined : readCursor(sort, after),
      // One more than shown tells whether there is a next page.
      limit: limit + 1,
    })
    const jobs = rows.slice(0, limit)
    const last = jobs.at(-1)
    return { jobs, next: last && rows.length > limit ? writeCursor(sort, last) : null }
  }
}

interface NewJob {
  companyId: string
  fields: z.output<typeof jobFieldsSchema>
  now: Date
}

/** Opens a job under the company's next number; numbers have no gaps. */
export async function createJob(database: Database, { companyId, fields, now }: NewJob): Promise<Job> {
  return database.transaction(async (transaction) => {
    await assertPerson(transaction, companyId, fields.personId)
    const number = await takeJobNumber(transaction, companyId)
    const stamps = { createdAt: now, updatedAt: now }
    const jobId = await insertJob(transaction, { ...fields, ...stamps, companyId, number })
    return readRow(transaction, { companyId, jobId })
  })
}

/** A job with its surveys. */
export async function readJob(
  database: Database,
  key: JobKey,
): Promise<{ job: Job; surveys: SurveySummary[] }> {
  const [job, surveys] = await Promise.all([readRow(database, key), listJobSurveys(database, key)])
  return { job, surveys }
}

/** Changes what a job says; what is not named stays. */
export async function changeJob(
  database: Database,
  key: JobKey,
  { changes, now }: { changes: z.output<typeof jobChangesSchema>; now: Date },
): Promise<Job> {
  const before = await readRow(database, key)
  // Whoever has the job may keep it, disabled or not.
  if (changes.personId !== before.personId) await assertPerson(database, key.companyId, changes.personId)
  return update(database, key, { ...changes, updatedAt: now })
}

/** Moves a job to any other stage: work also goes back. */
export const moveJob = (
  database: Database,
  key: JobKey,
  { stage, now }: { stage: Stage; now: Date },
): Promise<Job> => update(database, key, { stage, updatedAt: now })

async function update(
  database: Database,
  key: JobKey,
  changes: JobChanges & { updatedAt: Date },
): Promise<Job> {
  if (!(await updateJob(database, key, changes))) throw noSuchJob()
  return readRow(database, key)
}

async function readRow(database: Database, key: JobKey): Promise<Job> {
  const row = await selectJob(database, key)
  if (!row) throw noSuchJob()
  return row
}

async function assertPerson(
  database: Database,
  companyId: string,
  personId: string | null | undefined,
): Promise<void> {
  if (personId === null || personId === undefined) return
  if (!(await isActivePerson(database, { companyId, personId }))) throw notAPerson()
}
