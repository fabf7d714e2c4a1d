import type { Database } from '../client'
import { companies } from '../tables/companies'
import { jobs } from '../tables/jobs'
import { people as peopleTable } from '../tables/people'
import { hashNewPassword } from '../../features/session/passwords'
import { demoCompany, type DemoJob, demoJobs, demoSignIns } from './demo-company'

export interface DemoPeople {
  companyId: string
  /** Ids by e-mail address. */
  ids: ReadonlyMap<string, string>
  /** Who measures. */
  surveyor: { id: string; name: string }
}

export async function insertDemoCompany(database: Database): Promise<DemoPeople> {
  const { name, units, fraction } = demoCompany
  const [company] = await database
    .insert(companies)
    .values({
      name,
      lengthUnit: units.length,
      forceUnit: units.force,
      fraction,
      lastJobNumber: demoJobs.length,
    })
    .returning({ id: companies.id })
  if (!company) throw new Error('The demo company was inserted and no row came back.')
  const rows = await Promise.all(
    demoSignIns.map(async ({ password, ...person }) => ({
      ...person,
      companyId: company.id,
      passwordHash: await hashNewPassword(password, 'password'),
    })),
  )
  const inserted = await database.insert(peopleTable).values(rows).returning()
  const surveyor = inserted.find(({ roles }) => roles.includes('surveyor'))
  if (!surveyor) throw new Error('The demo company has no surveyor.')
  return { companyId: company.id, ids: new Map(inserted.map(({ email, id }) => [email, id])), surveyor }
}

interface DemoJobRow {
  people: DemoPeople
  job: DemoJob
  number: number
  createdAt: Date
  due: string | null
}

export async function insertDemoJob(
  database: Database,
  { people, job, number, createdAt, due }: DemoJobRow,
): Promise<string> {
  const { title, customer, site, stage, notes } = job
  const [row] = await database
    .insert(jobs)
    .values({
      companyId: people.companyId,
      personId: people.ids.get(job.with),
      ...{ number, title, customer, site, stage, notes, due },
      ...{ createdAt, updatedAt: createdAt },
    })
    .returning({ id: jobs.id })
  if (!row) throw new Error('A demo job was inserted and no row came back.')
  return row.id
}
