import { z } from 'zod'
import { idSchema } from './id'
import type { Quantities } from './quantities'

/** Why a reading was struck. */
export const strikeReasonSchema = z.string().max(200).regex(/\S/, 'expected the reason why it was struck')

/** A reading: a figure at a place (the heights `guard.readAt`), who and when; struck with a reason, never erased. */
export const makeReadingSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    at: z.enum(['top', 'bottom']).default('top'),
    value: q.positive,
    by: z.string().max(120).optional(),
    on: z.iso
      .datetime({ offset: true, error: 'expected a date and time such as 2026-05-04T10:12:00Z' })
      .optional(),
    struck: strikeReasonSchema.optional(),
  })

export type Reading = z.infer<ReturnType<typeof makeReadingSchema>>
export type ReadingPlace = Reading['at']

const skew = z.number().min(-89).max(89).default(0)

/** A bay: the clear gap between two neighbouring posts. `taped` says how a stair bay was read; angles in degrees. */
export const makeBaySchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    from: idSchema,
    to: idSchema,
    kind: z.enum(['level', 'stair']).default('level'),
    spacers: z.int().min(0).max(50).default(0),
    skewFrom: skew,
    skewTo: skew,
    taped: z.enum(['slope', 'level']).default('slope'),
    rise: q.positive.optional(),
    going: q.positive.optional(),
    gauge: z.number().min(0).max(80).optional(),
    readings: z.array(makeReadingSchema(q)).default([]),
  })

export type Bay = z.infer<ReturnType<typeof makeBaySchema>>
