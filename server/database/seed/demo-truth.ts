import { readFile } from 'node:fs/promises'
import path from 'node:path'
import { z } from 'zod'
import type { DemoPicture } from './demo-company'

const pixels = z.tuple([z.number(), z.number()])
const taped = z.object({ in: z.number() })
const pair = { from: z.string(), to: z.string() }

/** What the seed needs of a picture's truth; lengths in inches. See `demo/README.md`. */
const truthSchema = z.object({
  posts: z.array(
    z.object({
      id: z.string(),
      material: z.enum(['softwood', 'hardwood']),
      sizeAlong: z.number(),
      sizeAcross: z.number(),
      basePx: pixels,
      topPx: pixels,
    }),
  ),
  runs: z.array(z.object({ id: z.string(), posts: z.array(z.string()) })),
  corners: z.array(z.object({ post: z.string(), angleDeg: z.number() })),
  diagonals: z.array(z.object({ ...pair, length: z.number(), centreToCentre: z.number().optional() })),
  reference: z.object({
    width: z.number(),
    depth: z.number(),
    cornersPx: z.tuple([pixels, pixels, pixels, pixels]),
  }),
  /** Of the deck above the ground. */
  deckZ: z.number(),
  taped: z.object({
    bays: z.array(z.object({ ...pair, kind: z.enum(['level', 'stair']), bottom: taped, top: taped })),
    overall: z.array(z.object({ run: z.string(), innerBottom: taped, innerTop: taped })),
    diagonals: z.array(z.object({ ...pair, length: taped })),
    stair: z.object({ rise: taped, going: taped }).optional(),
  }),
  exif: z.object({ DateTimeOriginal: z.string() }),
})
export type DemoTruth = z.infer<typeof truthSchema>

export async function readDemoTruth(folder: string, picture: DemoPicture): Promise<DemoTruth> {
  const text = await readFile(path.join(folder, 'truth', `${picture}.truth.json`), 'utf8')
  return truthSchema.parse(JSON.parse(text))
}

export const readDemoPicture = (folder: string, picture: DemoPicture): Promise<Buffer> =>
  readFile(path.join(folder, 'photos', `${picture}.jpg`))
