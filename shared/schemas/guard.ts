import { z } from 'zod'
import type { Quantities } from './quantities'
import { inches } from '../units/length'

/**
 * What the guard must be. Heights are from the walking surface, on a stair from the nosing line. Starting values are
 * those of IRC 2021 R312.1 for one- and two-family dwellings; local code decides.
 * `topRailUnderside` left out is the height less 1 1/2 in, a cap of nominal 2 in lumber.
 */
export const makeGuardSchema = (q: Quantities) =>
  z.strictObject({
    rules: z.string().min(1).max(60).default('irc-2021'),
    height: q.positive.default(inches(36)),
    topRailUnderside: q.positive.optional(),
    bottom: q.size.default(inches(0)),
    sphere: q.positive.default(inches(4)),
    stairSphere: q.positive.default(inches(4.375)),
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
