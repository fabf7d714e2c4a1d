import { sql } from 'drizzle-orm'
import {
  type AnyPgColumn,
  date,
  foreignKey,
  index,
  integer,
  pgTable,
  primaryKey,
  text,
  timestamp,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core'
import { stages } from '@shared/schemas/job'
import { companies } from './companies'
import { people } from './people'

/** A job without a date comes after all that have one; the index and the queries must say it alike. */
export const dueOrNever = (due: AnyPgColumn) => sql`coalesce(${due}, 'infinity'::date)`

export const jobs = pgTable(
  'jobs',
  {
    companyId: uuid('company_id')
      .notNull()
      .references(() => companies.id),
    id: uuid('id').notNull().defaultRandom(),
    number: integer('number').notNull(),
    title: text('title').notNull(),
    customer: text('customer').notNull(),
    site: text('site').notNull(),
    stage: text('stage', { enum: stages }).notNull().default('measure'),
    due: date('due', { mode: 'string' }),
    /** The person the job is with. */
    personId: uuid('person_id'),
    notes: text('notes').notNull().default(''),
    createdAt: timestamp('created_at', { withTimezone: true, precision: 3 }).notNull().defaultNow(),
    updatedAt: timestamp('updated_at', { withTimezone: true, precision: 3 }).notNull().defaultNow(),
    /** What the search looks in, in small letters. */
    searched: text('searched')
      .notNull()
      .generatedAlwaysAs(sql`lower(number::text || ' ' || title || ' ' || customer || ' ' || site)`),
  },
  (table) => [
    primaryKey({ columns: [table.companyId, table.id] }),
    uniqueIndex('jobs_number').on(table.companyId, table.number),
    foreignKey({ columns: [table.companyId, table.personId], foreignColumns: [people.companyId, people.id] }),
    // One index for each way of listing, in the order of the keyset.
    index('jobs_updated').on(table.companyId, table.updatedAt, table.id),
    index('jobs_due').on(table.companyId, dueOrNever(table.due), table.id),
    index('jobs_stage').on(table.companyId, table.stage, table.updatedAt, table.id),
    index('jobs_person').on(table.companyId, table.personId, table.updatedAt, table.id),
  ],
)
