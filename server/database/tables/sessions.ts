import { foreignKey, index, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core'
import { people } from './people'

/** Only a hash of the session's id is kept: who reads the table cannot sign in with it. */
export const sessions = pgTable(
  'sessions',
  {
    idHash: text('id_hash').primaryKey(),
    /** Whose it is, so that all of a person's sessions can be ended; none before sign-in. */
    companyId: uuid('company_id'),
    personId: uuid('person_id'),
    data: jsonb('data').notNull(),
    expiresAt: timestamp('expires_at', { withTimezone: true }).notNull(),
  },
  (table) => [
    foreignKey({ columns: [table.companyId, table.personId], foreignColumns: [people.companyId, people.id] }),
    index('sessions_person').on(table.personId),
    index('sessions_expiry').on(table.expiresAt),
  ],
)
