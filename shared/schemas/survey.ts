import { z } from 'zod'
import { makeBaySchema } from './bay'
import { overruleSchema } from './finding'
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

export const surveyTitleSchema = z.string().min(1).max(120)

/** A diagonal, post centre to post centre. */
export type Diagonal = z.infer<ReturnType<typeof makeDiagonalSchema>>
/** The plan angle between two runs at a post, in degrees. */
export type Corner = z.infer<typeof cornerSchema>

/** How many of each a survey may have. */
export const surveyLimits = {
  posts: 1000,
  bays: 1000,
  runs: 1000,
  diagonals: 200,
  corners: 200,
  photos: 100,
  overruled: 200,
} as const

/** The measured description of a site, in the quantities given; every name in it must lead somewhere. */
export const makeSurveySchema = (q: Quantities) =>
  z
    .strictObject({
      format: z.literal('tautbook.survey'),
      version: z.literal(SURVEY_VERSION),
      units: unitsSchema,
      title: surveyTitleSchema,
      guard: makeGuardSchema(q).prefault({}),
      posts: z.array(makePostSchema(q)).max(surveyLimits.posts).default([]),
      bays: z.array(makeBaySchema(q)).max(surveyLimits.bays).default([]),
      runs: z.array(makeRunSchema(q)).max(surveyLimits.runs).default([]),
      diagonals: z.array(makeDiagonalSchema(q)).max(surveyLimits.diagonals).default([]),
      corners: z.array(cornerSchema).max(surveyLimits.corners).default([]),
      photos: z.array(makePhotoSchema(q)).max(surveyLimits.photos).default([]),
      overruled: z.array(overruleSchema).max(surveyLimits.overruled).default([]),
    })
    .superRefine((survey, context) =>
      checkSurveyReferences(survey, (path, input, message) =>
        context.addIssue({ code: 'custom', path, input, message }),
      ),
    )

/** A survey as the program keeps it: whole nanometres and newtons; `units` says how it is shown and exported. */
export const surveySchema = makeSurveySchema(storedQuantities)
export type Survey = z.infer<typeof surveySchema>
