import { foreignKey, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { people } from './people'

/** One-time links. Only a hash of the token is kept; a person has one at a time. */
export const invitations = pgTable(
  'invitations',
  {
    tokenHash: text('token_hash').primaryKey(),
    companyId: uuid('company_id').notNull(),
    personId: uuid('person_id').notNull().unique(),
    expiresAt: timestamp('expires_at', { withTimezone: true }).notNull(),
  },
  (table) => [
    foreignKey({ columns: [table.companyId, table.personId], foreignColumns: [people.companyId, people.id] }),
  ],
)
