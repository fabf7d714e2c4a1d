import { foreignKey, pgTable, primaryKey, unique } from 'drizzle-orm/pg-core'
import { companies } from './companies'
import { entryColumns } from './hardware'

/** Guard rules of the company's own; published ones are built in. */
export const guardRules = pgTable('guard_rules', entryColumns, (table) => [
  primaryKey({ columns: [table.companyId, table.key] }),
  unique('guard_rules_id_unique').on(table.companyId, table.id),
  foreignKey({ columns: [table.companyId], foreignColumns: [companies.id] }),
])
