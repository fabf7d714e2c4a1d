import { boolean, integer, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'

export const companies = pgTable('companies', {
  id: uuid('id').primaryKey().defaultRandom(),
  name: text('name').notNull(),
  lengthUnit: text('length_unit', { enum: ['in', 'mm'] }).notNull(),
  forceUnit: text('force_unit', { enum: ['lbf', 'N'] }).notNull(),
  /** Fractions shown in an inch house: 16, 32 or 64. */
  fraction: integer('fraction').notNull().default(16),
  keepPhotoPlace: boolean('keep_photo_place').notNull().default(false),
  /** The number the company's newest job has. */
  lastJobNumber: integer('last_job_number').notNull().default(0),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
})
