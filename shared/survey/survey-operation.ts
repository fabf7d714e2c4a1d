import { z } from 'zod'
import { makeBaySchema, makeReadingSchema, strikeReasonSchema } from '../schemas/bay'
import { findingPlaceSchema, findingSchema, overruleSchema } from '../schemas/finding'
import { makeGuardSchema } from '../schemas/guard'
import { idSchema } from '../schemas/id'
import { makePhotoSchema, makeRectangleSchema, postMarkSchema } from '../schemas/photo'
import { makePostSchema } from '../schemas/post'
import { storedQuantities as q, unitsSchema } from '../schemas/quantities'
import { makeRunSchema } from '../schemas/run'
import { cornerSchema, makeDiagonalSchema, surveyTitleSchema } from '../schemas/survey'
import { fieldChanges } from './field-changes'

/** Where something stands in its list, so that undo puts it back there; at the end when left out. */
const index = z.int().min(0).optional()
const id = idSchema
/** What a reading belongs to: a bay, or a run as an overall reading. */
const of = z.strictObject({ kind: z.enum(['bay', 'run']), id: idSchema })

const { id: _post, ...postFields } = makePostSchema(q).shape
const { id: _bay, readings: _bayReadings, ...bayFields } = makeBaySchema(q).shape
const { id: _run, readings: _runReadings, ...runFields } = makeRunSchema(q).shape

const named = <Type extends string, Shape extends z.ZodRawShape>(type: Type, shape: Shape) =>
  z.strictObject({ type: z.literal(type), ...shape })

/** The operations that change one thing. */
export const simpleOperationSchema = z.discriminatedUnion('type', [
  named('post.add', { post: makePostSchema(q), index }),
  named('post.remove', { id }),
  named('post.set', { id, ...fieldChanges(postFields) }),
  named('bay.add', { bay: makeBaySchema(q), index }),
  named('bay.remove', { id }),
  named('bay.set', { id, ...fieldChanges(bayFields) }),
  named('run.add', { run: makeRunSchema(q), index }),
  named('run.remove', { id }),
  named('run.set', { id, ...fieldChanges(runFields) }),
  named('reading.add', { of, reading: makeReadingSchema(q), index }),
  named('reading.strike', { of, id, reason: strikeReasonSchema }),
  /** The opposite of striking. */
  named('reading.restore', { of, id }),
  /** The opposite of adding, for undo in the same hand; the history keeps the reading. */
  named('reading.retract', { of, id }),
  named('corner.set', { corner: cornerSchema, index }),
  named('corner.remove', { post: idSchema }),
  named('diagonal.add', { diagonal: makeDiagonalSchema(q), index }),
  named('diagonal.remove', { id }),
  named('photo.add', { photo: makePhotoSchema(q), index }),
  named('photo.remove', { id }),
  named('photo.mark', { photo: idSchema, post: idSchema, mark: postMarkSchema }),
  named('photo.unmark', { photo: idSchema, post: idSchema }),
  named('photo.setRectangle', { photo: idSchema, rectangle: makeRectangleSchema(q) }),
  named('photo.clearRectangle', { photo: idSchema }),
  /** An owner or estimator lets a *stop* pass, with a reason. */
  named('stop.overrule', { overrule: overruleSchema, index }),
  /** The opposite: the stop stands again. */
  named('stop.uphold', { code: findingSchema.shape.code, where: findingPlaceSchema }),
  named('guard.set', fieldChanges(makeGuardSchema(q).shape)),
  named('survey.set', fieldChanges({ title: surveyTitleSchema, units: unitsSchema })),
])
export type SimpleOperation = z.infer<typeof simpleOperationSchema>

/** One named change of a survey; a `group` is several made by one gesture, undone in one step. */
export const surveyOperationSchema = z.discriminatedUnion('type', [
  ...simpleOperationSchema.options,
  named('group', { operations: z.array(simpleOperationSchema).min(1).max(2000) }),
])
export type SurveyOperation = z.infer<typeof surveyOperationSchema>
export type OperationOf<Type extends SurveyOperation['type']> = Extract<SurveyOperation, { type: Type }>
/** What a reading belongs to. */
export type ReadingOwner = z.infer<typeof of>
