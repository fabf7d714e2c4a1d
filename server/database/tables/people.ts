import type { Role } from '@shared/schemas/role'
import { sql } from 'drizzle-orm'
import { pgTable, primaryKey, text, timestamp, uniqueIndex, uuid } from 'drizzle-orm/pg-core'
import { companies } from './companies'

/** One person belongs to one company; an e-mail address signs in to one place. */
export const people = pgTable(
  'people',
  {
    companyId: uuid('company_id')
      .notNull()
      .references(() => companies.id),
    id: uuid('id').notNull().defaultRandom(),
    name: text('name').notNull(),
    email: text('email').notNull(),
    roles: text('roles').array().notNull().$type<Role[]>(),
    /** None until the one-time link has been used. */
    passwordHash: text('password_hash'),
    disabledAt: timestamp('disabled_at', { withTimezone: true }),
    lastSignInAt: timestamp('last_sign_in_at', { withTimezone: true }),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.companyId, table.id] }),
    uniqueIndex('people_id').on(table.id),
    uniqueIndex('people_email').on(sql`lower(${table.email})`),
  ],
)
