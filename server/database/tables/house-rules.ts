import { jsonb, pgTable, timestamp, uuid } from 'drizzle-orm/pg-core'
import { companies } from './companies'

/** One row per company, in stored units. */
export const houseRules = pgTable('house_rules', {
  companyId: uuid('company_id')
    .primaryKey()
    .references(() => companies.id),
  document: jsonb('document').notNull(),
  updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
})
