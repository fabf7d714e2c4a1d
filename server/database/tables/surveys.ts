import {
  foreignKey,
  index,
  integer,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  unique,
  uuid,
} from 'drizzle-orm/pg-core'
import { jobs } from './jobs'
import { people } from './people'

/** A survey as one document, and what lists show of it without opening the document. */
export const surveys = pgTable(
  'surveys',
  {
    companyId: uuid('company_id').notNull(),
    id: uuid('id').notNull().defaultRandom(),
    jobId: uuid('job_id').notNull(),
    /** How many changes it has seen. */
    revision: integer('revision').notNull().default(0),
    /** In stored units, of the version it was last written in. */
    document: jsonb('document').notNull(),
    title: text('title').notNull(),
    posts: integer('posts').notNull(),
    bays: integer('bays').notNull(),
    gaps: integer('gaps').notNull(),
    /** Id inside the survey of the first photo with marks. */
    firstPhoto: text('first_photo'),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
    updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
    /** Put away; the row and its history stay. */
    removedAt: timestamp('removed_at', { withTimezone: true }),
  },
  (table) => [
    primaryKey({ columns: [table.companyId, table.id] }),
    foreignKey({ columns: [table.companyId, table.jobId], foreignColumns: [jobs.companyId, jobs.id] }),
    index('surveys_job').on(table.companyId, table.jobId),
  ],
)

/** Every change a survey has seen; rows are only ever added. */
export const surveyChanges = pgTable(
  'survey_changes',
  {
    companyId: uuid('company_id').notNull(),
    surveyId: uuid('survey_id').notNull(),
    /** The revision this change made. */
    revision: integer('revision').notNull(),
    /** Made where the change happened; a change sent twice is done once. */
    changeId: uuid('change_id').notNull(),
    operation: jsonb('operation').notNull(),
    personId: uuid('person_id').notNull(),
    /** As the person was called then. */
    personName: text('person_name').notNull(),
    at: timestamp('at', { withTimezone: true }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.companyId, table.surveyId, table.revision] }),
    unique('survey_changes_change_unique').on(table.companyId, table.surveyId, table.changeId),
    foreignKey({
      columns: [table.companyId, table.surveyId],
      foreignColumns: [surveys.companyId, surveys.id],
    }),
    foreignKey({ columns: [table.companyId, table.personId], foreignColumns: [people.companyId, people.id] }),
  ],
)
