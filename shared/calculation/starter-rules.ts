import type { HouseRules } from '../schemas/house-rules'
import { makeHouseRulesSchema } from '../schemas/house-rules'
import { storedQuantities } from '../schemas/quantities'

/** The house rules a company starts with: those of the survey file's description, read with a class II tape. */
export const starterRules: HouseRules = makeHouseRulesSchema(storedQuantities).parse({ tapeClass: 'II' })
