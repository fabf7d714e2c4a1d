import type { Reading } from '../schemas/bay'
import type { Photo } from '../schemas/photo'
import { type Corner, type Survey, surveyLimits } from '../schemas/survey'
import { checkSurveyReferences } from '../schemas/survey-references'
import { assertNew, itemOf, placeOf, withChanged, withFields, withItem, withoutKey } from './lists'
import { OperationRefused } from './operation-refused'
import { overrulePlace } from './overrule'
import type { OperationOf, ReadingOwner, SimpleOperation, SurveyOperation } from './survey-operation'

/**
 * The survey after an operation, sharing what did not change; the survey given stays as it is.
 * A group is applied whole or not at all: what it leaves behind must hold together, what lies between need not.
 * @throws OperationRefused when the operation does not fit this survey.
 */
export function applyOperation(survey: Survey, operation: SurveyOperation): Survey {
  const changed = applySteps(survey, operation.type === 'group' ? operation.operations : [operation])
  assertHolds(survey, changed)
  return changed
}

/** Applies steps one after another without asking whether the survey holds together between them. */
export const applySteps = (survey: Survey, steps: readonly SimpleOperation[]): Survey =>
  steps.reduce(applySimple, survey)

/**
 * Every name in the survey leads somewhere, and no list is longer than a survey may have.
 * @throws OperationRefused with the first fault: `still-used` when something was removed that is still named.
 */
function assertHolds(before: Survey, changed: Survey): void {
  for (const [list, most] of Object.entries(surveyLimits)) {
    if (changed[list as keyof typeof surveyLimits].length <= most) continue
    throw new OperationRefused('not-fitting', `A survey has at most ${most} ${list}. Begin another survey.`)
  }
  const faults: { path: PropertyKey[]; input: unknown; message: string }[] = []
  checkSurveyReferences(changed, (path, input, message) => faults.push({ path, input, message }))
  const fault = faults[0]
  if (!fault) return
  const [list, index] = fault.path
  const owner = (changed[list as 'bays'] as { id?: string; post?: string }[])[Number(index)]
  const name = `${String(list).replace(/s$/, '')} ${owner?.id ?? owner?.post ?? ''}`
  const removed = removedNoun(before, changed, fault.input)
  throw removed
    ? new OperationRefused(
        'still-used',
        `The ${removed} ${String(fault.input)} is still used by ${name}. Remove or change that as well.`,
      )
    : new OperationRefused(
        'not-fitting',
        `This does not fit the survey: ${name} names ${String(fault.input)}; ${fault.message}.`,
      )
}

function removedNoun(before: Survey, changed: Survey, id: unknown): string | undefined {
  const has = (list: readonly { id: string }[]) => list.some((item) => item.id === id)
  if (has(before.posts) && !has(changed.posts)) return 'post'
  return has(before.bays) && !has(changed.bays) ? 'bay' : undefined
}

type Handlers = {
  [Type in SimpleOperation['type']]: (survey: Survey, operation: OperationOf<Type>) => Survey
}

const handlers: Handlers = {
  'post.add': (survey, { post, index }) => {
    assertNew(survey.posts, post.id, 'post')
    return { ...survey, posts: withItem(survey.posts, post, index) }
  },
  'post.remove': (survey, { id }) => ({
    ...survey,
    posts: survey.posts.toSpliced(placeOf(survey.posts, id, 'post'), 1),
  }),
  'post.set': (survey, operation) => {
    itemOf(survey.posts, operation.id, 'post')
    return {
      ...survey,
      posts: withChanged(survey.posts, operation.id, (post) => withFields(post, operation)),
    }
  },
  'bay.add': (survey, { bay, index }) => {
    assertNew(survey.bays, bay.id, 'bay')
    return { ...survey, bays: withItem(survey.bays, bay, index) }
  },
  'bay.remove': (survey, { id }) => ({
    ...survey,
    bays: survey.bays.toSpliced(placeOf(survey.bays, id, 'bay'), 1),
  }),
  'bay.set': (survey, operation) => {
    itemOf(survey.bays, operation.id, 'bay')
    return { ...survey, bays: withChanged(survey.bays, operation.id, (bay) => withFields(bay, operation)) }
  },
  'run.add': (survey, { run, index }) => {
    assertNew(survey.runs, run.id, 'run')
    return { ...survey, runs: withItem(survey.runs, run, index) }
  },
  'run.remove': (survey, { id }) => ({
    ...survey,
    runs: survey.runs.toSpliced(placeOf(survey.runs, id, 'run'), 1),
  }),
  'run.set': (survey, operation) => {
    itemOf(survey.runs, operation.id, 'run')
    return { ...survey, runs: withChanged(survey.runs, operation.id, (run) => withFields(run, operation)) }
  },
  'reading.add': (survey, { of, reading, index }) =>
    withReadings(survey, of, (readings) => {
      assertNew(readings, reading.id, 'reading')
      return withItem(readings, reading, index)
    }),
  'reading.strike': (survey, { of, id, reason }) =>
    withReadings(survey, of, (readings) => {
      if (itemOf(readings, id, 'reading').struck !== undefined) {
        throw new OperationRefused('already-there', `Reading ${id} of ${of.kind} ${of.id} is struck already.`)
      }
      return withChanged(readings, id, (reading) => ({ ...reading, struck: reason }))
    }),
  'reading.restore': (survey, { of, id }) =>
    withReadings(survey, of, (readings) => {
      if (itemOf(readings, id, 'reading').struck === undefined) {
        throw new OperationRefused('not-there', `Reading ${id} of ${of.kind} ${of.id} is not struck.`)
      }
      return withChanged(readings, id, (reading) => withoutKey(reading, 'struck'))
    }),
  'reading.retract': (survey, { of, id }) =>
    withReadings(survey, of, (readings) => readings.toSpliced(placeOf(readings, id, 'reading'), 1)),
  'corner.set': (survey, { corner, index }) => ({
    ...survey,
    corners: survey.corners.some((known) => known.post === corner.post)
      ? survey.corners.map((known) => (known.post === corner.post ? corner : known))
      : withItem(survey.corners, corner, index),
  }),
  'corner.remove': (survey, { post }) => ({
    ...survey,
    corners: survey.corners.toSpliced(cornerPlace(survey, post).index, 1),
  }),
  'diagonal.add': (survey, { diagonal, index }) => {
    assertNew(survey.diagonals, diagonal.id, 'diagonal')
    return { ...survey, diagonals: withItem(survey.diagonals, diagonal, index) }
  },
  'diagonal.remove': (survey, { id }) => ({
    ...survey,
    diagonals: survey.diagonals.toSpliced(placeOf(survey.diagonals, id, 'diagonal'), 1),
  }),
  'photo.add': (survey, { photo, index }) => {
    assertNew(survey.photos, photo.id, 'photo')
    return { ...survey, photos: withItem(survey.photos, photo, index) }
  },
  'photo.remove': (survey, { id }) => ({
    ...survey,
    photos: survey.photos.toSpliced(placeOf(survey.photos, id, 'photo'), 1),
  }),
  'photo.mark': (survey, { photo, post, mark }) =>
    withPhoto(survey, photo, (known) => ({ ...known, posts: { ...known.posts, [post]: mark } })),
  'photo.unmark': (survey, { photo, post }) =>
    withPhoto(survey, photo, (known) => {
      if (!Object.hasOwn(known.posts, post)) {
        throw new OperationRefused('not-there', `Post ${post} is not marked on photo ${photo}.`)
      }
      return { ...known, posts: withoutKey(known.posts, post) }
    }),
  'photo.setRectangle': (survey, { photo, rectangle }) =>
    withPhoto(survey, photo, (known) => ({ ...known, rectangle })),
  'photo.clearRectangle': (survey, { photo }) =>
    withPhoto(survey, photo, (known) => withoutKey(known, 'rectangle')),
  'stop.overrule': (survey, { overrule, index }) => {
    const place = overrulePlace(survey, overrule)
    return {
      ...survey,
      overruled:
        place === undefined
          ? withItem(survey.overruled, overrule, index)
          : survey.overruled.with(place, overrule),
    }
  },
  'stop.uphold': (survey, stop) => {
    const place = overrulePlace(survey, stop)
    if (place === undefined) throw new OperationRefused('not-there', 'This stop was not overruled.')
    return { ...survey, overruled: survey.overruled.toSpliced(place, 1) }
  },
  'guard.set': (survey, operation) => ({ ...survey, guard: withFields(survey.guard, operation) }),
  'survey.set': (survey, operation) => withFields(survey, operation),
}

function applySimple(survey: Survey, operation: SimpleOperation): Survey {
  // The table has a handler for exactly this type; TypeScript cannot follow the pairing.
  const handler = handlers[operation.type] as (survey: Survey, operation: SimpleOperation) => Survey
  return handler(survey, operation)
}

function withReadings(survey: Survey, of: ReadingOwner, change: (readings: Reading[]) => Reading[]): Survey {
  if (of.kind === 'bay') {
    itemOf(survey.bays, of.id, 'bay')
    return {
      ...survey,
      bays: withChanged(survey.bays, of.id, (bay) => ({ ...bay, readings: change(bay.readings) })),
    }
  }
  itemOf(survey.runs, of.id, 'run')
  return {
    ...survey,
    runs: withChanged(survey.runs, of.id, (run) => ({ ...run, readings: change(run.readings) })),
  }
}

function withPhoto(survey: Survey, id: string, change: (photo: Photo) => Photo): Survey {
  itemOf(survey.photos, id, 'photo')
  return { ...survey, photos: withChanged(survey.photos, id, change) }
}

/** The corner angle of a post and its place in the list. @throws OperationRefused `not-there` */
export function cornerPlace(survey: Survey, post: string): { index: number; corner: Corner } {
  const index = survey.corners.findIndex((corner) => corner.post === post)
  const corner = survey.corners[index]
  if (!corner) throw new OperationRefused('not-there', `Post ${post} has no corner angle.`)
  return { index, corner }
}
