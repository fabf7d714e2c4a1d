import { z } from 'zod'
import { makeBaySchema } from './bay'
import { makeGuardSchema } from './guard'
import { idSchema } from './id'
import { makePhotoSchema } from './photo'
import { makePostSchema } from './post'
import { type Quantities, storedQuantities, unitsSchema } from './quantities'
import { makeRunSchema } from './run'
import { checkSurveyReferences } from './survey-references'

/** The version of the survey's own format; older ones are brought up by `survey/survey-versions.ts`. */
export const SURVEY_VERSION = 1

export const makeDiagonalSchema = (q: Quantities) =>
  z.strictObject({ id: idSchema, from: idSchema, to: idSchema, value: q.positive })
export const cornerSchema = z.strictObject({ post: idSchema, angle: z.number().gt(0).max(180) })

/** A diagonal, post centre to post centre. */
export type Diagonal = z.infer<ReturnType<typeof makeDiagonalSchema>>
/** The plan angle between two runs at a post, in degrees. */
export type Corner = z.infer<typeof cornerSchema>

/** The measured description of a site, in the quantities given; every name in it must lead somewhere. */
export const makeSurveySchema = (q: Quantities) =>
  z
    .strictObject({
      format: z.literal('tautbook.survey'),
      version: z.literal(SURVEY_VERSION),
      units: unitsSchema,
      title: z.string().min(1).max(120),
      guard: makeGuardSchema(q).prefault({}),
      posts: z.array(makePostSchema(q)).max(1000).default([]),
      bays: z.array(makeBaySchema(q)).max(1000).default([]),
      runs: z.array(makeRunSchema(q)).max(1000).default([]),
      diagonals: z.array(makeDiagonalSchema(q)).max(200).default([]),
      corners: z.array(cornerSchema).max(200).default([]),
      photos: z.array(makePhotoSchema(q)).max(100).default([]),
    })
    .superRefine((survey, context) =>
      checkSurveyReferences(survey, (path, input, message) =>
        context.addIssue({ code: 'custom', path, input, message }),
      ),
    )

/** A survey as the program keeps it: whole nanometres and newtons; `units` says how it is shown and exported. */
export const surveySchema = makeSurveySchema(storedQuantities)
export type Survey = z.infer<typeof surveySchema>
