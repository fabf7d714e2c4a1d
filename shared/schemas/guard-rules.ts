import { z } from 'zod'
import { idSchema } from './id'
import { type Quantities, storedQuantities, unitsSchema } from './quantities'

/** How well a figure is known: read in the source, in a faithful copy, remembered, or the company's own. */
export const basisSchema = z.enum(['read', 'copy', 'memory', 'own'])
export type Basis = z.infer<typeof basisSchema>

/** Where a figure stands: section or table of the rules, and how well it is known. */
const source = { section: z.string().min(1).max(120), basis: basisSchema }

const figure = <Value extends z.ZodType>(value: Value) => z.strictObject({ value, ...source })

/**
 * Guard rules: the height, opening and load rules of a code, each figure with its section and how well it is known.
 * What a code does not say is left out, and not checked.
 */
export const makeGuardRulesSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    name: z.string().min(1).max(120),
    edition: z.string().min(1).max(60),
    /** For own rules: the rules they were copied from. */
    basedOn: z.string().max(160).optional(),
    /** The units the code writes its figures in. */
    units: unitsSchema,
    /** A guard is needed above this fall. */
    neededOver: figure(q.positive).optional(),
    /** Required heights, by situation where the code tells several apart. */
    situations: z
      .array(
        z.strictObject({
          id: idSchema,
          name: z.string().min(1).max(160),
          height: figure(q.positive),
          /** The situation holds only up to this fall. */
          upToFall: q.positive.optional(),
        }),
      )
      .min(1)
      .max(12),
    /** Above the nosing line. */
    stairHeight: figure(q.positive).optional(),
    /** The band in which the top of a stair guard may also be the handrail. */
    handrail: z.strictObject({ least: q.positive, most: q.positive, ...source }).optional(),
    /** No sphere of this size may pass. */
    sphere: figure(q.positive),
    /** Above a height a larger sphere is allowed. */
    upperSphere: z.strictObject({ above: q.positive, value: q.positive, ...source }).optional(),
    /** On stairs, where it differs. */
    stairSphere: figure(q.positive).optional(),
    /** The triangle of riser, tread and lowest member. */
    stairTriangle: figure(q.positive).optional(),
    riser: figure(q.positive).optional(),
    tread: figure(q.positive).optional(),
    /** A single load at any point of the top. */
    topLoad: figure(q.force).optional(),
    /** A load on a square of the infill, normal to it. */
    infillLoad: z.strictObject({ value: q.force, side: q.positive, ...source }).optional(),
    /** Nothing climbable between these heights, at a fall above `fallOver`. */
    climbable: z
      .strictObject({
        fallOver: q.size.optional(),
        from: q.size,
        to: q.positive,
        /** To be avoided rather than forbidden. */
        advice: z.boolean().optional(),
        ...source,
      })
      .optional(),
    /** Cables are looked up in the tables of NCC 2022 Housing Provisions 11.3.6. */
    wireTables: z.strictObject({ ...source }).optional(),
    /** What the rules say besides, for people to read. */
    notes: z
      .array(z.strictObject({ text: z.string().min(1).max(400), ...source }))
      .max(30)
      .default([]),
  })

export type GuardRules = z.infer<ReturnType<typeof makeGuardRulesSchema>>
export type Situation = GuardRules['situations'][number]
/** Where a figure of the rules stands. */
export interface FigureSource {
  section: string
  basis: Basis
}

/** Guard rules in the program's own units. */
export const guardRulesSchema = makeGuardRulesSchema(storedQuantities)
