import type { Role } from '../../shared/schemas/role'
import { hash } from 'bcryptjs'
import type { OpenDatabase } from '../../server/database/client'
import { companies, people } from '../../server/database/tables/index'

export interface Filled {
  companyId: string
  email: string
  password: string
}

/** A company of twenty people with so many jobs, some of them with a survey, and a smaller one beside it. */
export async function fillWithJobs({ database, sql }: OpenDatabase, count: number): Promise<Filled> {
  const password = 'only for measuring'
  const [company, other] = await database
    .insert(companies)
    .values([
      { name: 'Bench', lengthUnit: 'in', forceUnit: 'lbf' },
      { name: 'Beside', lengthUnit: 'mm', forceUnit: 'N' },
    ])
    .returning()
  if (!company || !other) throw new Error('The companies for the measuring were not made.')
  const staff = Array.from({ length: 20 }, (_, i) => ({
    companyId: company.id,
    name: `Person ${i}`,
    email: `person-${i}@example.com`,
    roles: (i === 0 ? ['owner'] : ['surveyor']) satisfies Role[],
  }))
  const passwordHash = await hash(password, 10)
  const made = await database
    .insert(people)
    .values(staff.map((person) => ({ ...person, passwordHash })))
    .returning({ id: people.id })
  const ids = made.map(({ id }) => id)
  for (const [companyId, jobs] of [
    [company.id, count],
    [other.id, count / 10],
  ] as const) {
    await sql`
      insert into jobs (company_id, number, title, customer, site, stage, due, person_id, created_at, updated_at)
      select ${companyId}, n, 'Deck number ' || n, 'Customer ' || n % 5000, n || ' Orchard Lane',
        (array['measure','check','price','agreed','shop','fit','done','lost'])[1 + n % 8],
        case when n % 3 > 0 then date '2026-01-01' + n % 700 end,
        ${companyId === company.id ? sql`(${ids}::uuid[])[1 + n % 20]` : sql`null`},
        now() - n * interval '1 minute', now() - (n * 7919 % ${jobs}::int) * interval '1 minute'
      from generate_series(1, ${jobs}::int) n`
  }
  await sql`
    insert into surveys (company_id, job_id, document, title, posts, bays, gaps)
    select company_id, id, '{}', 'Back deck', 4, 3, 0 from jobs where company_id = ${company.id} and number % 2 = 0`
  await sql`vacuum analyze`
  return { companyId: company.id, email: 'person-0@example.com', password }
}
