import { z } from 'zod'
import { makeReadingSchema } from './bay'
import { idSchema } from './id'
import type { Quantities } from './quantities'
import { inches } from '../units/length'

/** How the cables of a run stand: evenly, at a fixed spacing down from the rail, or at heights given one by one. */
export const makeCableLayoutSchema = (q: Quantities) =>
  z.union([
    z.strictObject({ layout: z.enum(['even', 'fixed']), spacing: q.positive }),
    z.strictObject({ heights: z.array(q.positive).min(1).max(60) }),
  ])

export type CableLayout = z.infer<ReturnType<typeof makeCableLayoutSchema>>

/** A run: a straight set of bays that one cable spans. `readings` are overall readings, end face to end face. */
export const makeRunSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    bays: z.array(idSchema).min(1),
    cable: idSchema,
    tension: q.force.optional(),
    readings: z.array(makeReadingSchema(q)).default([]),
    cables: makeCableLayoutSchema(q).default({ layout: 'even', spacing: inches(3) }),
  })

export type Run = z.infer<ReturnType<typeof makeRunSchema>>
