import type { Database } from '../../server/database/client'
import { jobs } from '../../server/database/tables/jobs'
import { takeJobNumber } from '../../server/features/jobs/jobs.queries'
import { createCompany } from './company'

export type JobRow = typeof jobs.$inferSelect

/** A job at the stage measure, of a new company unless said otherwise, under the company's next number. */
export async function createJob(
  database: Database,
  given: Partial<typeof jobs.$inferInsert> = {},
): Promise<JobRow> {
  const companyId = given.companyId ?? (await createCompany(database)).id
  const number = given.number ?? (await takeJobNumber(database, companyId))
  const fields = { title: 'Back deck', customer: 'Ines Calloway', site: '4 Orchard Lane' }
  const [job] = await database
    .insert(jobs)
    .values({ ...fields, ...given, companyId, number })
    .returning()
  return job!
}
