import { z } from 'zod'
import { idSchema } from './id'
import type { Quantities } from './quantities'

export const materials = ['softwood', 'hardwood', 'veneered', 'masonry', 'metal'] as const
export const materialSchema = z.enum(materials)
export const coreSchema = z.enum(['softwood', 'hardwood', 'masonry', 'metal'])
/** What is seen of a post. */
export type Material = z.infer<typeof materialSchema>
/** What is under the cover of a post. */
export type Core = z.infer<typeof coreSchema>

/**
 * A post. `along` is its size parallel to the first bay that names it, `across` at right angles, both outside
 * the cover. Material and sizes may be missing while the survey is under way; what needs them then says so.
 */
export const makePostSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    material: materialSchema.optional(),
    core: coreSchema.optional(),
    cover: q.size.optional(),
    along: q.positive.optional(),
    across: q.positive.optional(),
    /** Species and grade, an id of the house's lumber. */
    lumber: idSchema.optional(),
    /** Whether the top rail ties this post's top, where it differs from the guard's `railTies`. */
    railTies: z.boolean().optional(),
    note: z.string().max(500).optional(),
  })

export type Post = z.infer<ReturnType<typeof makePostSchema>>
