import fc from 'fast-check'
import { type Survey, surveySchema } from '@shared/schemas/survey'

/** Ids that are valid and awkward: what every object has, and what looks like a number. */
const ids = ['P1', 'P2', 'constructor', 'toString', '7', 'a.b-c_d', 'valueOf', 'X9']

const nm = fc.oneof(
  fc.integer({ min: 1, max: 5_000_000_000 }),
  fc.constantFrom(396_875, 1, 1_000_000_000_000),
)
const size = fc.oneof(nm, fc.constant(0))
const text = fc.string({ minLength: 1, maxLength: 30 }).filter((written) => written.trim() !== '')
const fixed = <Item>(...items: Item[]) => fc.constantFrom(...items)
const readingId = fixed('r1', 'r2', 'r3', 'constructor')
const optional = <Shape extends object>(
  shape: { [Key in keyof Shape]: fc.Arbitrary<Shape[Key]> },
  required: (keyof Shape)[],
) => fc.record(shape, { requiredKeys: required as never[] }) as fc.Arbitrary<Partial<Shape>>

export const postFields = optional(
  {
    material: fixed('softwood', 'hardwood', 'veneered', 'masonry', 'metal'),
    core: fixed('softwood', 'hardwood', 'masonry', 'metal'),
    cover: size,
    along: nm,
    across: nm,
    lumber: fixed('southern-pine-2', 'hem-fir-2'),
    railTies: fc.boolean(),
    note: fc.string({ maxLength: 40 }),
  },
  [],
)
export const reading = optional(
  {
    id: readingId,
    at: fixed('top', 'bottom'),
    value: nm,
    by: fc.string({ maxLength: 20 }),
    on: fixed('2026-05-04T10:12:00Z', '2026-05-04T10:12:00+02:00'),
    struck: text,
  },
  ['id', 'at', 'value'],
)
const readings = fc.uniqueArray(reading, { selector: ({ id }) => id, maxLength: 3 })
export const bayFields = optional(
  {
    kind: fixed('level', 'stair'),
    spacers: fc.integer({ min: 0, max: 50 }),
    skewFrom: fc.integer({ min: -89, max: 89 }),
    skewTo: fc.double({ min: -89, max: 89, noNaN: true }).map((angle) => angle + 0),
    taped: fixed('slope', 'level'),
    rise: nm,
    going: nm,
    gauge: fc.integer({ min: 0, max: 80 }),
  },
  ['kind', 'spacers', 'skewFrom', 'skewTo', 'taped'],
)
export const runFields = optional(
  {
    cable: fixed('c532', 'c18'),
    tension: fc.integer({ min: 1, max: 5000 }),
    cables: fc.oneof(
      fc.record({ layout: fixed('even', 'fixed'), spacing: nm }),
      fc.record({ heights: fc.array(nm, { minLength: 1, maxLength: 4 }) }),
    ),
  },
  ['cable', 'cables'],
)
const point = fc.tuple(fc.integer({ min: 0, max: 2560 }), fc.integer({ min: 0, max: 2560 }))
export const mark = optional({ base: point, top: point }, ['base'])
export const rectangle = fc.record({ width: nm, depth: nm, corners: fc.tuple(point, point, point, point) })
export const cornerAngle = fc.integer({ min: 1, max: 180 })
export const guardFields = optional(
  {
    rules: fixed('irc-2021', 'nbc-2020', 'house'),
    situation: fixed('dwelling', 'general'),
    fall: size,
    railTies: fc.boolean(),
    height: nm,
    topRailUnderside: nm,
    bottom: size,
    sphere: nm,
    stairSphere: nm,
    readAt: fc.record({ top: size, bottom: size }),
    stair: optional({ height: nm, topRailUnderside: nm, bottom: size }, []),
  },
  [],
)
const place = fc.oneof(
  fc.constant({}),
  fc.record({ run: fixed('R0', 'R1'), bay: fixed('B0', 'B1') }),
  fc.record({ post: fixed(...ids) }),
)
/** An overrule of one of a few stops, so that the same one is often met again. */
export const overrule = fc.record({
  code: fixed('opening-between', 'guard-too-low'),
  where: place,
  text: fixed('The opening is 4 in.', 'The opening is 5 in.'),
  reason: text,
})
export const units = fc.record({ length: fixed('in', 'mm'), force: fixed('lbf', 'N') })
export const title = fixed('Back deck', ' Harbour stair ', 'Ü')
export const length = nm

/** How many of these, up to `most`, chosen with a number each. */
const seeds = (most: number) => fc.array(fc.nat(), { maxLength: most })
const pick = <Item>(list: readonly Item[], seed: number): Item => list[seed % list.length]!

/** A path of bays from one chosen at random, each once, as far as the seeds go. */
function pathOfBays(
  bays: readonly { id: string; from: string; to: string }[],
  choices: readonly number[],
): string[] {
  const first = bays[(choices[0] ?? 0) % Math.max(1, bays.length)]
  if (!first) return []
  const path = [first.id]
  let [before, at] = [first.from, first.to]
  for (const choice of choices.slice(1)) {
    const onward = bays.filter(
      ({ id, from, to }) =>
        !path.includes(id) && (from === at || to === at) && from !== before && to !== before,
    )
    if (onward.length === 0) break
    const next = pick(onward, choice)
    path.push(next.id)
    ;[before, at] = [at, next.from === at ? next.to : next.from]
  }
  return path
}

const distinct = (list: readonly string[], choices: readonly number[]) => [
  ...new Set(choices.map((choice) => pick(list, choice))),
]

const parts = fc.record({
  units,
  title,
  guard: guardFields,
  posts: fc.array(postFields, { minLength: 2, maxLength: 7 }),
  bays: fc.array(fc.record({ fields: bayFields, from: fc.nat(), to: fc.nat(), readings }), { maxLength: 7 }),
  runs: fc.array(fc.record({ fields: runFields, path: seeds(5), readings }), { maxLength: 3 }),
  diagonals: fc.array(fc.record({ from: fc.nat(), to: fc.nat(), value: nm }), { maxLength: 2 }),
  corners: fc.array(fc.tuple(fc.nat(), cornerAngle), { maxLength: 3 }),
  overruled: fc.uniqueArray(overrule, {
    maxLength: 3,
    selector: ({ code, where }) => JSON.stringify([code, where]),
  }),
  photos: fc.array(
    fc.record({
      posts: fc.array(fc.tuple(fc.nat(), mark), { maxLength: 3 }),
      rectangle: fc.option(rectangle, { nil: undefined }),
    }),
    { maxLength: 2 },
  ),
})

/** Any survey that is valid: rows, rings, forks, bays side by side, runs that overlap, awkward ids. */
export const anySurvey: fc.Arbitrary<Survey> = parts.map((given) => {
  const posts = given.posts.map((fields, i) => ({ id: ids[i]!, ...fields }))
  const names = posts.map(({ id }) => id)
  const between = ({ from, to }: { from: number; to: number }) => {
    const start = from % names.length
    return { from: names[start]!, to: names[(start + 1 + (to % (names.length - 1))) % names.length]! }
  }
  const bays = given.bays.map((bay, i) => ({
    id: `B${i}`,
    ...between(bay),
    ...bay.fields,
    readings: bay.readings,
  }))
  return surveySchema.parse({
    format: 'tautbook.survey',
    version: 1,
    units: given.units,
    title: given.title,
    guard: given.guard,
    posts,
    bays,
    runs: given.runs.flatMap((run, i) => {
      const path = pathOfBays(bays, run.path)
      return path.length > 0 ? [{ id: `R${i}`, bays: path, ...run.fields, readings: run.readings }] : []
    }),
    diagonals: given.diagonals.map((diagonal, i) => ({
      id: `D${i}`,
      ...between(diagonal),
      value: diagonal.value,
    })),
    corners: distinct(
      names,
      given.corners.map(([post]) => post),
    ).map((post, i) => ({ post, angle: given.corners[i]![1] })),
    overruled: given.overruled,
    photos: given.photos.map((photo, i) => ({
      id: `F${i}`,
      file: `deck-${i}.jpg`,
      posts: Object.fromEntries(photo.posts.map(([post, where]) => [pick(names, post), where])),
      ...(photo.rectangle ? { rectangle: photo.rectangle } : {}),
    })),
  })
})
