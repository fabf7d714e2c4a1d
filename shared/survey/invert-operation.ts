import type { Photo, PostMark } from '../schemas/photo'
import type { Survey } from '../schemas/survey'
import { applySteps, cornerPlace } from './apply-operation'
import type { Reading } from '../schemas/bay'
import { itemOf, placeOf } from './lists'
import { OperationRefused } from './operation-refused'
import { overrulePlace } from './overrule'
import type { OperationOf, ReadingOwner, SimpleOperation, SurveyOperation } from './survey-operation'

/**
 * The opposite of an operation, against the survey before it: applied afterwards it brings that survey back whole,
 * order included.
 * @throws OperationRefused when the operation does not fit this survey.
 */
export function invertOperation(before: Survey, operation: SurveyOperation): SurveyOperation {
  if (operation.type !== 'group') return invertSimple(before, operation)
  const opposites: SimpleOperation[] = []
  let survey = before
  for (const step of operation.operations) {
    opposites.unshift(invertSimple(survey, step))
    survey = applySteps(survey, [step])
  }
  return { type: 'group', operations: opposites }
}

type Inverters = {
  [Type in SimpleOperation['type']]: (survey: Survey, operation: OperationOf<Type>) => SimpleOperation
}

const inverters: Inverters = {
  'post.add': (_survey, { post }) => ({ type: 'post.remove', id: post.id }),
  'post.remove': ({ posts }, { id }) => ({
    type: 'post.add',
    post: itemOf(posts, id, 'post'),
    index: placeOf(posts, id, 'post'),
  }),
  'post.set': ({ posts }, operation) => ({
    ...operation,
    ...fieldsBack(itemOf(posts, operation.id, 'post'), operation),
  }),
  'bay.add': (_survey, { bay }) => ({ type: 'bay.remove', id: bay.id }),
  'bay.remove': ({ bays }, { id }) => ({
    type: 'bay.add',
    bay: itemOf(bays, id, 'bay'),
    index: placeOf(bays, id, 'bay'),
  }),
  'bay.set': ({ bays }, operation) => ({
    ...operation,
    ...fieldsBack(itemOf(bays, operation.id, 'bay'), operation),
  }),
  'run.add': (_survey, { run }) => ({ type: 'run.remove', id: run.id }),
  'run.remove': ({ runs }, { id }) => ({
    type: 'run.add',
    run: itemOf(runs, id, 'run'),
    index: placeOf(runs, id, 'run'),
  }),
  'run.set': ({ runs }, operation) => ({
    ...operation,
    ...fieldsBack(itemOf(runs, operation.id, 'run'), operation),
  }),
  'reading.add': (_survey, { of, reading }) => ({ type: 'reading.retract', of, id: reading.id }),
  'reading.strike': (_survey, { of, id }) => ({ type: 'reading.restore', of, id }),
  'reading.restore': (survey, { of, id }) => {
    const { struck } = itemOf(readingsOf(survey, of), id, 'reading')
    if (struck === undefined) throw new OperationRefused('not-there', `Reading ${id} is not struck.`)
    return { type: 'reading.strike', of, id, reason: struck }
  },
  'reading.retract': (survey, { of, id }) => {
    const readings = readingsOf(survey, of)
    return {
      type: 'reading.add',
      of,
      reading: itemOf(readings, id, 'reading'),
      index: placeOf(readings, id, 'reading'),
    }
  },
  'corner.set': ({ corners }, { corner }) => {
    const known = corners.find(({ post }) => post === corner.post)
    return known ? { type: 'corner.set', corner: known } : { type: 'corner.remove', post: corner.post }
  },
  'corner.remove': (survey, { post }) => {
    const { index, corner } = cornerPlace(survey, post)
    return { type: 'corner.set', corner, index }
  },
  'diagonal.add': (_survey, { diagonal }) => ({ type: 'diagonal.remove', id: diagonal.id }),
  'diagonal.remove': ({ diagonals }, { id }) => ({
    type: 'diagonal.add',
    diagonal: itemOf(diagonals, id, 'diagonal'),
    index: placeOf(diagonals, id, 'diagonal'),
  }),
  'photo.add': (_survey, { photo }) => ({ type: 'photo.remove', id: photo.id }),
  'photo.remove': ({ photos }, { id }) => ({
    type: 'photo.add',
    photo: itemOf(photos, id, 'photo'),
    index: placeOf(photos, id, 'photo'),
  }),
  'photo.mark': ({ photos }, { photo, post }) => {
    const mark = markOf(itemOf(photos, photo, 'photo'), post)
    return mark ? { type: 'photo.mark', photo, post, mark } : { type: 'photo.unmark', photo, post }
  },
  'photo.unmark': ({ photos }, { photo, post }) => {
    const mark = markOf(itemOf(photos, photo, 'photo'), post)
    if (!mark) throw new OperationRefused('not-there', `Post ${post} is not marked on photo ${photo}.`)
    return { type: 'photo.mark', photo, post, mark }
  },
  'photo.setRectangle': (survey, { photo }) => rectangleBack(survey, photo),
  'photo.clearRectangle': (survey, { photo }) => rectangleBack(survey, photo),
  'stop.overrule': ({ overruled }, { overrule }) => {
    const known = overruled[overrulePlace({ overruled }, overrule) ?? -1]
    return known
      ? { type: 'stop.overrule', overrule: known }
      : { type: 'stop.uphold', code: overrule.code, where: overrule.where }
  },
  'stop.uphold': ({ overruled }, stop) => {
    const index = overrulePlace({ overruled }, stop)
    const overrule = overruled[index ?? -1]
    if (!overrule) throw new OperationRefused('not-there', 'This stop was not overruled.')
    return { type: 'stop.overrule', overrule, index }
  },
  'guard.set': ({ guard }, operation) => ({ type: 'guard.set', ...fieldsBack(guard, operation) }),
  'survey.set': (survey, operation) => ({ type: 'survey.set', ...fieldsBack(survey, operation) }),
}

function invertSimple(survey: Survey, operation: SimpleOperation): SimpleOperation {
  // The table has an inverter for exactly this type; TypeScript cannot follow the pairing.
  const inverter = inverters[operation.type] as (
    survey: Survey,
    operation: SimpleOperation,
  ) => SimpleOperation
  return inverter(survey, operation)
}

/** The keys a `set` would touch, as they are now. */
function fieldsBack<Thing extends object, Key extends string>(
  thing: Thing,
  { set, unset }: { set: Partial<Record<Key, unknown>>; unset: readonly Key[] },
) {
  const touched = [...new Set([...(Object.keys(set) as Key[]), ...unset])]
  const known = thing as Partial<Record<Key, unknown>>
  const present = touched.filter((key) => known[key] !== undefined)
  return {
    set: Object.fromEntries(present.map((key) => [key, known[key]])),
    unset: touched.filter((key) => known[key] === undefined),
  }
}

function rectangleBack({ photos }: Survey, photo: string): SimpleOperation {
  const { rectangle } = itemOf(photos, photo, 'photo')
  return rectangle
    ? { type: 'photo.setRectangle', photo, rectangle }
    : { type: 'photo.clearRectangle', photo }
}

/** A post may be called as something every object has, such as `constructor`. */
const markOf = ({ posts }: Photo, post: string): PostMark | undefined =>
  Object.hasOwn(posts, post) ? posts[post] : undefined

function readingsOf({ bays, runs }: Survey, { kind, id }: ReadingOwner): Reading[] {
  return (kind === 'bay' ? itemOf(bays, id, 'bay') : itemOf(runs, id, 'run')).readings
}
