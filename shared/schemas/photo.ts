import { z } from 'zod'
import type { PhotoPoint } from '../geometry/point'
import { idSchema } from './id'
import type { Quantities } from './quantities'

const photoPointSchema: z.ZodType<PhotoPoint, PhotoPoint> = z.tuple([z.number(), z.number()])

export const postMarkSchema = z.strictObject({ base: photoPointSchema, top: photoPointSchema.optional() })
/** Where a post shows on a photo: a stroke from its base to its top. */
export type PostMark = z.infer<typeof postMarkSchema>

/** A rectangle of known size on the deck: corners clockwise from the near left one. */
export const makeRectangleSchema = (q: Quantities) =>
  z.strictObject({
    width: q.positive,
    depth: q.positive,
    corners: z.tuple([photoPointSchema, photoPointSchema, photoPointSchema, photoPointSchema]),
  })

export type Rectangle = z.infer<ReturnType<typeof makeRectangleSchema>>

/** A photo with its marks, in pixels of the upright picture. `file` names the picture. */
export const makePhotoSchema = (q: Quantities) =>
  z.strictObject({
    id: idSchema,
    file: z.string().min(1).max(200),
    posts: z.record(idSchema, postMarkSchema).default({}),
    rectangle: makeRectangleSchema(q).optional(),
  })

export type Photo = z.infer<ReturnType<typeof makePhotoSchema>>
