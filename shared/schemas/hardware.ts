import { z } from 'zod'
import { idSchema } from './id'
import { coreSchema, materialSchema } from './post'
import type { Quantities } from './quantities'

export const constructions = ['7x7', '7x19', '1x19'] as const

/** A cable. `axialStiffness` is EA; `settlingStretch` the constructional stretch as a strain. */
export const makeCableSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    name: z.string().min(1).max(120),
    construction: z.enum(constructions),
    diameter: q.positive,
    axialStiffness: q.force,
    settlingStretch: z.number().min(0).max(0.05).default(0.00125),
    breakingLoad: q.force.optional(),
    /** Price of one metre or one foot of cable is the price book's matter; this figure only breaks ties. */
    price: q.price.optional(),
  })

export type Cable = z.infer<ReturnType<typeof makeCableSchema>>

/**
 * A fitting. `body` is its length below the post face, `headProjection` how far it stands proud, `cutPastFace` where
 * the bare cable's end sits, measured from the fitting's own outer face toward the post. Angles in degrees.
 */
export const makeFittingSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    name: z.string().min(1).max(120),
    mount: z.enum(['drilled', 'surface']),
    materials: z.array(materialSchema).min(1),
    cables: z.array(idSchema).min(1),
    body: q.size,
    headProjection: q.size,
    cutPastFace: q.length,
    takeUp: q.positive,
    /** The most it may be loaded with, as its maker says. */
    rating: q.force.optional(),
    maxAngle: z.number().min(0).max(90).default(0),
    maxRun: q.positive.optional(),
    minGrip: z.partialRecord(materialSchema, q.size).default({}),
    hole: q.positive.optional(),
    spotFace: q.positive.optional(),
    tap: z.array(coreSchema).default([]),
    price: q.price.optional(),
  })

export type Fitting = z.infer<ReturnType<typeof makeFittingSchema>>

export const makeHardwareSchema = (q: Quantities) =>
  z.strictObject({ cables: z.array(makeCableSchema(q)), fittings: z.array(makeFittingSchema(q)) })

/** The catalogue a calculation chooses from. */
export type Hardware = z.infer<ReturnType<typeof makeHardwareSchema>>
