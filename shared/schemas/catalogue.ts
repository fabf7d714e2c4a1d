import { z } from 'zod'
import { guardRulesSchema } from './guard-rules'
import { makeCableSchema, makeFittingSchema } from './hardware'
import { makeHouseRulesSchema } from './house-rules'
import { keySchema } from './id'
import { storedQuantities } from './quantities'

export const cableSchema = makeCableSchema(storedQuantities)
export const fittingSchema = makeFittingSchema(storedQuantities)
export const houseRulesSchema = makeHouseRulesSchema(storedQuantities)

/** An entry of the company's hardware: what it is, and whether it is still offered. Retired ones stay readable for old surveys. */
const entry = { key: keySchema, retired: z.boolean(), updatedAt: z.iso.datetime() }
export const catalogueCableSchema = z.object({ ...entry, cable: cableSchema })
export const catalogueFittingSchema = z.object({ ...entry, fitting: fittingSchema })
export const catalogueSchema = z.object({
  cables: z.array(catalogueCableSchema),
  fittings: z.array(catalogueFittingSchema),
})
/** Guard rules of the company's own. Retired ones stay readable for old surveys. */
export const ownGuardRulesSchema = z.object({ ...entry, rules: guardRulesSchema })
export type OwnGuardRules = z.infer<typeof ownGuardRulesSchema>
export type CatalogueCable = z.infer<typeof catalogueCableSchema>
export type CatalogueFitting = z.infer<typeof catalogueFittingSchema>
export type Catalogue = z.infer<typeof catalogueSchema>
