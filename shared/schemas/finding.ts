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

/**
 * Something the tool noticed. `code` is for programs and tests, `text` one sentence or two for people, `rule` the
 * published or house rule behind it, with its section where it has one.
 */
export const findingSchema = z.strictObject({
  level: findingLevelSchema,
  code: z.string().regex(/^[a-z]+(-[a-z]+)*$/),
  where: findingPlaceSchema,
  text: z.string().min(1),
  rule: z.string().min(1).optional(),
})
export type Finding = z.infer<typeof findingSchema>

/**
 * A *stop* that an owner or estimator let pass: with its reason, who and when. It stands only for the very finding that
 * was read then: when its numbers change, the stop is back.
 */
export const overruleSchema = z.strictObject({
  code: findingSchema.shape.code,
  where: findingPlaceSchema,
  text: findingSchema.shape.text,
  reason: z.string().max(400).regex(/\S/, 'expected the reason why it was overruled'),
  by: z.string().max(120).optional(),
  on: z.iso.datetime({ offset: true }).optional(),
})
export type Overrule = z.infer<typeof overruleSchema>

/** The most specific place of a finding as one short name: a post, else a bay, else a run. */
export const placeName = ({ post, bay, run }: FindingPlace): string => post ?? bay ?? run ?? 'survey'
