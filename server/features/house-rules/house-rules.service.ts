import { starterRules } from '@shared/calculation/starter-rules'
import { houseRulesSchema } from '@shared/schemas/catalogue'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { Database } from '../../database/client'
import { selectHouseRules, upsertHouseRules } from './house-rules.queries'

/** The company's rules; keys that came later take their starting values. */
export async function readHouseRules(database: Database, companyId: string): Promise<HouseRules> {
  const stored = await selectHouseRules(database, companyId)
  return stored === undefined ? starterRules : houseRulesSchema.parse(stored)
}

/** Puts these rules in the place of the company's. */
export async function changeHouseRules(
  database: Database,
  companyId: string,
  rules: HouseRules,
): Promise<HouseRules> {
  await upsertHouseRules(database, companyId, rules)
  return rules
}
