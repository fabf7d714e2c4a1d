import { z } from 'zod'
import { idSchema } from './id'
import type { Quantities } from './quantities'
import { inches } from '../units/length'

/**
 * What the guard must be. Heights are from the walking surface, on a stair from the nosing line. Starting values are
 * those of IRC 2021 R312.1 for one- and two-family dwellings; local code decides. A sphere left out is that of the rules.
 * `topRailUnderside` left out is the height less 1 1/2 in, a cap of nominal 2 in lumber.
 */
export const makeGuardSchema = (q: Quantities) =>
  z.strictObject({
    rules: z.string().min(1).max(60).default('irc-2021'),
    /** Which of the situations these rules tell apart this is; the strictest when left out. */
    situation: idSchema.optional(),
    /** How far the walking surface is above the floor or ground below. */
    fall: q.size.optional(),
    /** Whether the top rail ties the tops of the end posts, so that they are propped and no cantilevers. */
    railTies: z.boolean().optional(),
    height: q.positive.default(inches(36)),
    topRailUnderside: q.positive.optional(),
    bottom: q.size.default(inches(0)),
    /** The sphere that must not pass, where it is not the guard rules' own. */
    sphere: q.positive.optional(),
    stairSphere: q.positive.optional(),
    readAt: z
      .strictObject({ top: q.size.default(inches(33)), bottom: q.size.default(inches(3)) })
      .default({ top: inches(33), bottom: inches(3) }),
    stair: z
      .strictObject({
        height: q.positive.optional(),
        topRailUnderside: q.positive.optional(),
        bottom: q.size.optional(),
      })
      .optional(),
  })

export type Guard = z.infer<ReturnType<typeof makeGuardSchema>>
