import {
  boolean,
  foreignKey,
  jsonb,
  pgTable,
  primaryKey,
  text,
  timestamp,
  unique,
  uuid,
} from 'drizzle-orm/pg-core'
import { companies } from './companies'

/** What every entry of a company’s catalogue is kept with. */
export const entryColumns = {
  companyId: uuid('company_id').notNull(),
  key: uuid('key').notNull().defaultRandom(),
  /** The catalogue's own id, `c532`; unique in the company and never changed, since surveys name it. */
  id: text('id').notNull(),
  /** The cable or fitting in stored units, its id included. */
  document: jsonb('document').notNull(),
  retired: boolean('retired').notNull().default(false),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
  updatedAt: timestamp('updated_at', { withTimezone: true }).notNull().defaultNow(),
}

export const cables = pgTable('cables', entryColumns, (table) => [
  primaryKey({ columns: [table.companyId, table.key] }),
  unique('cables_id_unique').on(table.companyId, table.id),
  foreignKey({ columns: [table.companyId], foreignColumns: [companies.id] }),
])

export const fittings = pgTable('fittings', entryColumns, (table) => [
  primaryKey({ columns: [table.companyId, table.key] }),
  unique('fittings_id_unique').on(table.companyId, table.id),
  foreignKey({ columns: [table.companyId], foreignColumns: [companies.id] }),
])
