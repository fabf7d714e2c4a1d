import { z } from 'zod'
import { keySchema } from './id'
import { unitsSchema } from './quantities'

export const companyNameSchema = z.string().trim().min(1, 'Write the company’s name.').max(120)

export const companySchema = z.object({
  id: keySchema,
  name: z.string(),
  /** Units new surveys are measured in. */
  units: unitsSchema,
  /** Fractions on the keypad and in lists, for inch houses. */
  fraction: z.union([z.literal(16), z.literal(32), z.literal(64)]),
  /** Whether the place a photo was taken is kept with it. */
  keepPhotoPlace: z.boolean(),
})
export type Company = z.infer<typeof companySchema>
export const companyChangesSchema = companySchema
  .omit({ id: true })
  .extend({ name: companyNameSchema })
  .partial()
