import { and, asc, desc, eq, getTableColumns, isNull, like, type SQL, sql } from 'drizzle-orm'
import type { Stage } from '@shared/schemas/job'
import type { Database } from '../../database/client'
import { companies } from '../../database/tables/companies'
import { dueOrNever, jobs } from '../../database/tables/jobs'
import { people } from '../../database/tables/people'
import { surveys } from '../../database/tables/surveys'
import type { JobCursor } from './job-page'

export interface JobKey {
  companyId: string
  jobId: string
}

const { companyId: _company, searched: _searched, ...ownColumns } = getTableColumns(jobs)
const columns = {
  ...ownColumns,
  personName: people.name,
  surveyCount: sql<number>`(
    select count(*)::int from ${surveys}
    where ${surveys.companyId} = ${jobs.companyId} and ${surveys.jobId} = ${jobs.id} and ${surveys.removedAt} is null)`,
}

const selectJobs = (database: Database) =>
  database
    .select(columns)
    .from(jobs)
    .leftJoin(people, and(eq(people.companyId, jobs.companyId), eq(people.id, jobs.personId)))
export type JobRow = Awaited<ReturnType<typeof selectJobs>>[number]

const there = ({ companyId, jobId }: JobKey) => and(eq(jobs.companyId, companyId), eq(jobs.id, jobId))

export async function selectJob(database: Database, key: JobKey): Promise<JobRow | undefined> {
  const [row] = await selectJobs(database).where(there(key))
  return row
}

export interface JobListing {
  companyId: string
  /** Every one of these must occur. */
  words: string[]
  stage?: Stage
  personId?: string
  sort: JobCursor['sort']
  after?: JobCursor
  limit: number
}

/** Jobs in one order, beginning after a place in it: each order has an index that ends with the same columns. */
export const selectJobPage = (
  database: Database,
  { companyId, words, stage, personId, sort, after, limit }: JobListing,
): Promise<JobRow[]> =>
  selectJobs(database)
    .where(
      and(
        eq(jobs.companyId, companyId),
        stage === undefined ? undefined : eq(jobs.stage, stage),
        personId === undefined ? undefined : eq(jobs.personId, personId),
        ...words.map((word) => like(jobs.searched, sql`'%' || lower(${escaped(word)}) || '%'`)),
        after && beyond(after),
      ),
    )
    .orderBy(...order[sort])
    .limit(limit)

const dueDate = dueOrNever(jobs.due)
const order: Record<JobCursor['sort'], SQL[]> = {
  updated: [desc(jobs.updatedAt), desc(jobs.id)],
  due: [asc(dueDate), asc(jobs.id)],
  number: [desc(jobs.number)],
}

function beyond(after: JobCursor): SQL {
  if (after.sort === 'number') return sql`${jobs.number} < ${after.number}`
  if (after.sort === 'due') return sql`(${dueDate}, ${jobs.id}) > (${after.due}::date, ${after.id}::uuid)`
  return sql`(${jobs.updatedAt}, ${jobs.id}) < (${after.at}::timestamptz, ${after.id}::uuid)`
}

/** Signs that `like` would read as “anything” stand for themselves. */
const escaped = (word: string): string => word.replace(/[\\%_]/g, (sign) => `\\${sign}`)

/** The company's next job number; whoever asks at the same time waits for this transaction. */
export async function takeJobNumber(transaction: Database, companyId: string): Promise<number> {
  const [row] = await transaction
    .update(companies)
    .set({ lastJobNumber: sql`${companies.lastJobNumber} + 1` })
    .where(eq(companies.id, companyId))
    .returning({ number: companies.lastJobNumber })
  if (!row) throw new Error(`There is no company ${companyId} to number a job for.`)
  return row.number
}

export async function insertJob(database: Database, job: typeof jobs.$inferInsert): Promise<string> {
  const [row] = await database.insert(jobs).values(job).returning({ id: jobs.id })
  if (!row) throw new Error('A job was inserted and no row came back.')
  return row.id
}

export type JobChanges = Partial<
  Pick<typeof jobs.$inferInsert, 'title' | 'customer' | 'site' | 'due' | 'personId' | 'notes' | 'stage'>
>

/** Whether there was such a job. */
export async function updateJob(
  database: Database,
  key: JobKey,
  changes: JobChanges & { updatedAt: Date },
): Promise<boolean> {
  const rows = await database.update(jobs).set(changes).where(there(key)).returning({ id: jobs.id })
  return rows.length > 0
}

export async function isActivePerson(
  database: Database,
  { companyId, personId }: { companyId: string; personId: string },
): Promise<boolean> {
  const rows = await database
    .select({ id: people.id })
    .from(people)
    .where(and(eq(people.companyId, companyId), eq(people.id, personId), isNull(people.disabledAt)))
  return rows.length > 0
}
