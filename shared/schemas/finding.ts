import { z } from 'zod'
import { idSchema } from './id'

export const findingLevels = ['note', 'check', 'stop'] as const
export const findingLevelSchema = z.enum(findingLevels)
export type FindingLevel = z.infer<typeof findingLevelSchema>

/** Where a finding is: as many ids as are known, so that a screen can go there. `cable` counts from 1, the lowest. */
export const findingPlaceSchema = z.strictObject({
  post: idSchema.optional(),
  bay: idSchema.optional(),
  run: idSchema.optional(),
  cable: z.int().min(1).optional(),
  reading: idSchema.optional(),
})
export type FindingPlace = z.infer<typeof findingPlaceSchema>

/** Something the tool noticed. `code` is for programs and tests, `text` one sentence or two for people. */
export const findingSchema = z.strictObject({
  level: findingLevelSchema,
  code: z.string().regex(/^[a-z]+(-[a-z]+)*$/),
  where: findingPlaceSchema,
  text: z.string().min(1),
})
export type Finding = z.infer<typeof findingSchema>

/** The most specific place of a finding as one short name: a post, else a bay, else a run. */
export const placeName = ({ post, bay, run }: FindingPlace): string => post ?? bay ?? run ?? 'survey'
