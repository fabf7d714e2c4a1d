import { z } from 'zod'
import { keySchema } from './id'
import { surveySchema } from './survey'

/** A photo as the server keeps it: upright, at most 2560 px, without its place unless the company keeps that. */
export const photoRecordSchema = z.object({
  id: keySchema,
  /** The id the photo has inside the survey. */
  surveyPhotoId: z.string(),
  name: z.string(),
  width: z.int(),
  height: z.int(),
  bytes: z.int(),
  takenAt: z.iso.datetime({ local: true, offset: true }).nullable(),
  /** Focal length as on 35 mm film, in millimetres. */
  focalLength35: z.number().nullable(),
  place: z.object({ latitude: z.number(), longitude: z.number() }).nullable(),
})
export type PhotoRecord = z.infer<typeof photoRecordSchema>

/** A survey with where it belongs and how often it has changed. */
export const surveyRecordSchema = z.object({
  id: keySchema,
  jobId: keySchema,
  jobNumber: z.int(),
  jobTitle: z.string(),
  revision: z.int(),
  survey: surveySchema,
  photos: z.array(photoRecordSchema),
  updatedAt: z.iso.datetime(),
})
export type SurveyRecord = z.infer<typeof surveyRecordSchema>

/** A survey in a list. */
export const surveySummarySchema = z.object({
  id: keySchema,
  jobId: keySchema,
  title: z.string(),
  revision: z.int(),
  posts: z.int(),
  bays: z.int(),
  /** How many things `find-gaps` still misses. */
  gaps: z.int(),
  thumbnailPhotoId: keySchema.nullable(),
  updatedAt: z.iso.datetime(),
})
export type SurveySummary = z.infer<typeof surveySummarySchema>
