import fc from 'fast-check'
import type { Survey } from '@shared/schemas/survey'
import { removeBays } from '@shared/survey/remove-bay'
import { removePosts } from '@shared/survey/remove-post'
import { applySteps } from '@shared/survey/apply-operation'
import {
  type ReadingOwner,
  type SurveyOperation,
  surveyOperationSchema,
} from '@shared/survey/survey-operation'
import * as any from './survey-arbitrary'

type Kind = SurveyOperation['type']
type Make = (survey: Survey) => fc.Arbitrary<unknown> | undefined

/** One of a list; nothing where it is empty. */
const one = <Item>(list: readonly Item[]) => (list.length > 0 ? fc.constantFrom(...list) : undefined)
const index = fc.option(fc.nat({ max: 9 }), { nil: undefined })
/** A record of these, with keys that are undefined left out; nothing where a part can be nothing. */
function record(type: Kind, shape: Record<string, fc.Arbitrary<unknown> | undefined>) {
  if (Object.values(shape).some((part) => part === undefined)) return undefined
  return fc.record(shape as Record<string, fc.Arbitrary<unknown>>).map((fields) => ({ type, ...fields }))
}

/** `set` some of these fields and `unset` some of those that may be absent. */
const changes = (fields: fc.Arbitrary<object>, absent: readonly string[]) => ({
  set: fields.chain((some) =>
    fc.subarray(Object.entries(some)).map((entries) => Object.fromEntries(entries)),
  ),
  unset: fc.subarray([...absent]),
})

const idsOf = (list: readonly { id: string }[]) => list.map(({ id }) => id)

const used = (survey: Survey): Set<string> =>
  new Set([
    ...[...survey.bays, ...survey.diagonals].flatMap(({ from, to }) => [from, to]),
    ...survey.corners.map(({ post }) => post),
    ...survey.photos.flatMap(({ posts }) => Object.keys(posts)),
  ])
const freePosts = (survey: Survey) => idsOf(survey.posts).filter((id) => !used(survey).has(id))
const freeBays = (survey: Survey) => {
  const inRuns = new Set(survey.runs.flatMap(({ bays }) => bays))
  return idsOf(survey.bays).filter((id) => !inRuns.has(id))
}
const pair = (survey: Survey) =>
  survey.posts.length > 1
    ? fc.shuffledSubarray(idsOf(survey.posts), { minLength: 2, maxLength: 2 })
    : undefined
const newBay = (survey: Survey, id: string) =>
  fc
    .tuple(any.bayFields, pair(survey) ?? fc.constant([]))
    .map(([fields, [from, to]]) => ({ id, from, to, ...fields, readings: [] }))
const owners = (survey: Survey): ReadingOwner[] => [
  ...survey.bays.map(({ id }) => ({ kind: 'bay' as const, id })),
  ...survey.runs.map(({ id }) => ({ kind: 'run' as const, id })),
]
const readingsWhere = (survey: Survey, struck: boolean | undefined) =>
  [
    ...survey.bays.map(({ id, readings }) => ({ of: { kind: 'bay' as const, id }, readings })),
    ...survey.runs.map(({ id, readings }) => ({ of: { kind: 'run' as const, id }, readings })),
  ].flatMap(({ of, readings }) =>
    readings
      .filter((reading) => struck === undefined || (reading.struck !== undefined) === struck)
      .map(({ id }) => ({ of, id })),
  )
const onReading = (survey: Survey, type: Kind, struck?: boolean) =>
  one(readingsWhere(survey, struck))?.map((place) => ({ type, ...place }))

/** For each kind of operation, one that fits the survey given; nothing where the survey offers no place for it. */
const makers: Record<Exclude<Kind, 'group'>, Make> = {
  'post.add': () => record('post.add', { post: any.postFields.map((f) => ({ id: 'new', ...f })), index }),
  'post.remove': (survey) => record('post.remove', { id: one(freePosts(survey)) }),
  'post.set': (survey) =>
    record('post.set', {
      id: one(idsOf(survey.posts)),
      ...changes(any.postFields, [
        'material',
        'core',
        'cover',
        'along',
        'across',
        'lumber',
        'railTies',
        'note',
      ]),
    }),
  'bay.add': (survey) => record('bay.add', { bay: pair(survey) && newBay(survey, 'new'), index }),
  'bay.remove': (survey) => record('bay.remove', { id: one(freeBays(survey)) }),
  'bay.set': (survey) =>
    record('bay.set', { id: one(idsOf(survey.bays)), ...changes(any.bayFields, ['rise', 'going', 'gauge']) }),
  'run.add': (survey) =>
    record('run.add', {
      run:
        one(idsOf(survey.bays)) &&
        fc
          .tuple(any.runFields, fc.constantFrom(...idsOf(survey.bays)))
          .map(([fields, bay]) => ({ id: 'new', bays: [bay], ...fields, readings: [] })),
      index,
    }),
  'run.remove': (survey) => record('run.remove', { id: one(idsOf(survey.runs)) }),
  'run.set': (survey) =>
    record('run.set', {
      id: one(idsOf(survey.runs)),
      ...changes(
        fc
          .tuple(any.runFields, fc.constantFrom('', ...idsOf(survey.bays)))
          .map(([fields, bay]) => ({ ...fields, ...(bay ? { bays: [bay] } : {}) })),
        ['tension'],
      ),
    }),
  'reading.add': (survey) =>
    record('reading.add', {
      of: one(owners(survey)),
      reading: any.reading.map((r) => ({ ...r, id: 'new' })),
      index,
    }),
  'reading.strike': (survey) =>
    onReading(survey, 'reading.strike', false)?.map((operation) => ({
      ...operation,
      reason: 'digits swapped',
    })),
  'reading.restore': (survey) => onReading(survey, 'reading.restore', true),
  'reading.retract': (survey) => onReading(survey, 'reading.retract'),
  'corner.set': (survey) =>
    record('corner.set', {
      corner: fc.record({ post: fc.constantFrom(...idsOf(survey.posts)), angle: any.cornerAngle }),
      index,
    }),
  'corner.remove': (survey) => record('corner.remove', { post: one(survey.corners.map(({ post }) => post)) }),
  'diagonal.add': (survey) =>
    record('diagonal.add', {
      diagonal: fc
        .tuple(pair(survey) ?? fc.constant([]), any.length)
        .map(([[from, to], value]) => ({ id: 'new', from, to, value })),
      index,
    }),
  'diagonal.remove': (survey) => record('diagonal.remove', { id: one(idsOf(survey.diagonals)) }),
  'photo.add': () =>
    record('photo.add', { photo: fc.constant({ id: 'new', file: 'new.jpg', posts: {} }), index }),
  'photo.remove': (survey) => record('photo.remove', { id: one(idsOf(survey.photos)) }),
  'photo.mark': (survey) =>
    record('photo.mark', {
      photo: one(idsOf(survey.photos)),
      post: one(idsOf(survey.posts)),
      mark: any.mark,
    }),
  'photo.unmark': (survey) =>
    one(
      survey.photos.flatMap(({ id, posts }) => Object.keys(posts).map((post) => ({ photo: id, post }))),
    )?.map((where) => ({ type: 'photo.unmark', ...where })),
  'photo.setRectangle': (survey) =>
    record('photo.setRectangle', { photo: one(idsOf(survey.photos)), rectangle: any.rectangle }),
  'photo.clearRectangle': (survey) => record('photo.clearRectangle', { photo: one(idsOf(survey.photos)) }),
  'stop.overrule': () => record('stop.overrule', { overrule: any.overrule, index }),
  'stop.uphold': (survey) =>
    one(survey.overruled.map(({ code, where }) => ({ code, where })))?.map((stop) => ({
      type: 'stop.uphold',
      ...stop,
    })),
  'guard.set': () =>
    record(
      'guard.set',
      changes(any.guardFields, [
        'topRailUnderside',
        'stair',
        'sphere',
        'stairSphere',
        'situation',
        'fall',
        'railTies',
      ]),
    ),
  'survey.set': () => record('survey.set', changes(fc.record({ title: any.title, units: any.units }), [])),
}

export const simpleKinds = Object.keys(makers) as (keyof typeof makers)[]

/** What a program would send: through JSON and the schema, so that keys left undefined are absent. */
const asSent = (operation: unknown): SurveyOperation =>
  surveyOperationSchema.parse(JSON.parse(JSON.stringify(operation)))

/** A survey and one operation of this kind that fits it. */
export const fitting = (
  kind: keyof typeof makers,
): fc.Arbitrary<{ survey: Survey; operation: SurveyOperation }> =>
  any.anySurvey
    .map((survey) => ({ survey, made: makers[kind](survey) }))
    .filter(({ made }) => made !== undefined)
    .chain(({ survey, made }) => made!.map((operation) => ({ survey, operation: asSent(operation) })))

/** A survey and a group of one to five operations, each fitting the survey that those before it leave. */
export const fittingGroup: fc.Arbitrary<{ survey: Survey; operation: SurveyOperation }> = fc
  .tuple(any.anySurvey, fc.array(fc.tuple(fc.nat(), fc.nat()), { minLength: 1, maxLength: 5 }))
  .map(([survey, choices]) => {
    let at = survey
    const operations = choices.flatMap(([kind, seed]) => {
      const possible = simpleKinds.flatMap((name) => makers[name](at) ?? [])
      const made = possible[kind % possible.length]!
      const operation = asSent(fc.sample(made, { seed, numRuns: 1 })[0])
      if (operation.type === 'group') return []
      // A second thing called `new` does not fit.
      if (JSON.stringify(operation).includes('"id":"new"') && JSON.stringify(at).includes('"id":"new"'))
        return []
      at = applySteps(at, [operation])
      return [operation]
    })
    return { survey, operation: { type: 'group' as const, operations } }
  })
  .filter(({ operation }) => operation.operations.length > 0)

/** A survey and the group that removes some of its posts or bays with what hangs on them. */
export const fittingRemoval: fc.Arbitrary<{ survey: Survey; operation: SurveyOperation }> =
  any.anySurvey.chain((survey) =>
    fc
      .oneof(
        fc.subarray(idsOf(survey.posts), { minLength: 1 }).map((ids) => removePosts(survey, ids)),
        ...(survey.bays.length > 0
          ? [fc.subarray(idsOf(survey.bays), { minLength: 1 }).map((ids) => removeBays(survey, ids))]
          : []),
      )
      .map((operation) => ({ survey, operation: asSent(operation) })),
  )
