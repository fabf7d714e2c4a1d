import { z } from 'zod'
import { makeLumberSchema, startingLumber } from './lumber'
import type { Quantities } from './quantities'
import { poundsForce } from '../units/force'
import { inches } from '../units/length'

const temperature = z.number().min(-80).max(80)

/** The company's tolerances, limits and defaults. Starting values are those of docs/calculations. Angles in degrees. */
export const makeHouseRulesSchema = (q: Quantities) =>
  z.strictObject({
    cutStep: q.positive.default(inches(1 / 16)),
    holeStep: q.positive.default(inches(1 / 16)),
    stacking: z.enum(['rss', 'worst']).default('rss'),
    grouping: z.enum(['cable', 'run']).default('cable'),
    readingLimit: q.size.default(inches(1 / 16)),
    gaugeLimit: z.number().min(0).max(10).default(0.25),
    tapeClass: z.enum(['I', 'II', 'III']).optional(),
    cutLimit: q.size.default(inches(1 / 16)),
    seatLimit: q.size.default(inches(1 / 32)),
    reserve: z.number().min(0).max(0.9).default(0.15),
    trim: q.size.default(inches(4)),
    tension: q.force.default(poundsForce(150)),
    backWall: q.size.default(inches(1 / 2)),
    plumbLimit: q.size.default(inches(1 / 4)),
    maxBend: z.number().min(0).max(45).default(0),
    wideBay: q.positive.default(inches(48)),
    cornerOverlap: q.size.default(inches(1 / 16)),
    cornerWeb: q.size.default(inches(1 / 4)),
    keepOffcut: q.size.default(inches(60)),
    /** The longest run the house proposes; the fitting's own limit applies as well. */
    longestRun: q.positive.optional(),
    /** What a hole leaves of a post's core at either side, at least. */
    edgeWall: q.size.default(inches(1 / 2)),
    /** The push a sphere of the guard rules' size must withstand between two cables; the US codes set none. */
    leastPush: q.force.optional(),
    /** Design temperatures and the one at which cables are tensioned, °C. */
    coldest: temperature.default(-20),
    hottest: temperature.default(40),
    tensionedAt: temperature.default(15),
    /** Species and grades of posts; the first stands for a post that names none. */
    lumber: z.array(makeLumberSchema(q)).min(1).max(50).default(startingLumber),
    /** Posts stand outdoors: the wet service factor is taken where it applies. */
    wetService: z.boolean().default(true),
  })

export type HouseRules = z.infer<ReturnType<typeof makeHouseRulesSchema>>
