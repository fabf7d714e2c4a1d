import { and, asc, desc, eq, fillPlaceholders, isNull, like, type SQL, sql } from 'drizzle-orm'
import type { AnyPgColumn } from 'drizzle-orm/pg-core'
import type { Job, Stage } from '@shared/schemas/job'
import type { Database, OpenDatabase } from '../../database/client'
import { companies } from '../../database/tables/companies'
import { dueOrNever, jobs } from '../../database/tables/jobs'
import { people } from '../../database/tables/people'
import { surveys } from '../../database/tables/surveys'
import type { JobCursor } from './job-page'

export interface JobKey {
  companyId: string
  jobId: string
}

/** As JSON writes a time: a list has a hundred of them, and PostgreSQL is quicker at it. */
const written = (time: AnyPgColumn) =>
  sql`to_char(${time} at time zone 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"')`

/** Every column under the name and in the form a job is answered with, so that rows need no more work. */
const columns = {
  id: sql<string>`${jobs.id}`.as('id'),
  number: sql<number>`${jobs.number}`.as('number'),
  title: sql<string>`${jobs.title}`.as('title'),
  customer: sql<string>`${jobs.customer}`.as('customer'),
  site: sql<string>`${jobs.site}`.as('site'),
  stage: sql<Stage>`${jobs.stage}`.as('stage'),
  due: sql<string | null>`${jobs.due}::text`.as('due'),
  personId: sql<string | null>`${jobs.personId}`.as('personId'),
  personName: sql<string | null>`${people.name}`.as('personName'),
  notes: sql<string>`${jobs.notes}`.as('notes'),
  surveyCount: sql<number>`(
    select count(*)::int from ${surveys}
    where ${surveys.companyId} = ${jobs.companyId} and ${surveys.jobId} = ${jobs.id} and ${surveys.removedAt} is null)`.as(
    'surveyCount',
  ),
  createdAt: sql<string>`${written(jobs.createdAt)}`.as('createdAt'),
  updatedAt: sql<string>`${written(jobs.updatedAt)}`.as('updatedAt'),
} satisfies Record<keyof Job, unknown>

const selectJobs = (database: Database) =>
  database
    .select(columns)
    .from(jobs)
    .leftJoin(people, and(eq(people.companyId, jobs.companyId), eq(people.id, jobs.personId)))

const there = ({ companyId, jobId }: JobKey) => and(eq(jobs.companyId, companyId), eq(jobs.id, jobId))

export async function selectJob(database: Database, key: JobKey): Promise<Job | undefined> {
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

/** What a listing leaves out decides the form of its query; what it gives are values in it. */
type JobPageForm = Pick<JobListing, 'sort'> & {
  words: number
  stage: boolean
  person: boolean
  after: boolean
}

/** Jobs in one order, beginning after a place in it: each order has an index that ends with the same columns. */
export const jobPageQuery = (database: Database, form: JobPageForm) =>
  selectJobs(database)
    .where(
      and(
        eq(jobs.companyId, value('companyId')),
        form.stage ? eq(jobs.stage, value('stage')) : undefined,
        form.person ? eq(jobs.personId, value('personId')) : undefined,
        ...Array.from({ length: form.words }, (_, i) =>
          like(jobs.searched, sql`'%' || lower(${value(`word${i}`)}::text) || '%'`),
        ),
        form.after ? beyond[form.sort] : undefined,
      ),
    )
    .orderBy(...order[form.sort])
    .limit(value('limit'))
    .toSQL()

/**
 * Finds pages of jobs. The query of a form is put together once, and PostgreSQL reads it once per connection; the rows
 * are taken as the driver gives them, since to map fifty of them costs as much as to find them.
 */
export function jobPageFinder({
  database,
  sql: driver,
}: OpenDatabase): (listing: JobListing) => Promise<Job[]> {
  const known = new Map<string, ReturnType<typeof jobPageQuery>>()
  return ({ words, after, sort, ...listing }) => {
    const form = {
      sort,
      words: words.length,
      stage: listing.stage !== undefined,
      person: listing.personId !== undefined,
      after: after !== undefined,
    }
    const name = JSON.stringify(form)
    const { sql: text, params } = known.get(name) ?? jobPageQuery(database, form)
    known.set(name, { sql: text, params })
    const values = fillPlaceholders(params, { ...listing, ...after, ...wordValues(words) }) as string[]
    return driver.unsafe<Job[]>(text, values, { prepare: true })
  }
}

const value = (name: string) => sql.placeholder(name)
const wordValues = (words: string[]) =>
  Object.fromEntries(words.map((word, i) => [`word${i}`, escaped(word)] as const))

const dueDate = dueOrNever(jobs.due)
const order: Record<JobCursor['sort'], SQL[]> = {
  updated: [desc(jobs.updatedAt), desc(jobs.id)],
  due: [asc(dueDate), asc(jobs.id)],
  number: [desc(jobs.number)],
}

const beyond: Record<JobCursor['sort'], SQL> = {
  updated: sql`(${jobs.updatedAt}, ${jobs.id}) < (${value('at')}::timestamptz, ${value('id')}::uuid)`,
  due: sql`(${dueDate}, ${jobs.id}) > (${value('due')}::date, ${value('id')}::uuid)`,
  number: sql`${jobs.number} < ${value('number')}::int`,
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
