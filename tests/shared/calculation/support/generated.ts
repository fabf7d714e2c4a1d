import fc from 'fast-check'
import { starterHardware } from '@shared/calculation/starter-hardware'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { makeHouseRulesSchema } from '@shared/schemas/house-rules'
import { storedQuantities } from '@shared/schemas/quantities'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { inches } from '@shared/units/length'

const NM_PER_SIXTY_FOURTH = 396_875

/** A length in whole nanometres, within a range in inches. */
const length = (least: number, most: number) => fc.integer({ min: inches(least), max: inches(most) })
/** A length that is a whole number of sixty-fourths. */
const tape = (least: number, most: number) =>
  fc.integer({ min: least * 64, max: most * 64 }).map((parts) => parts * NM_PER_SIXTY_FOURTH)

const reading = fc.record({
  at: fc.constantFrom('top' as const, 'bottom' as const),
  value: fc.oneof(tape(6, 120), length(6, 120)),
})
const numbered = <Item extends object>(list: Item[]) => list.map((item, i) => ({ id: `r${i}`, ...item }))
const struck = reading.map((item) => ({ ...item, struck: 'misread' }))
/** Mostly something that counts; now and then nothing, or nothing but struck readings. */
const readings = fc
  .oneof(
    {
      weight: 9,
      arbitrary: fc.tuple(
        fc.array(reading, { minLength: 1, maxLength: 3 }),
        fc.array(struck, { maxLength: 1 }),
      ),
    },
    { weight: 1, arbitrary: fc.tuple(fc.constant([]), fc.array(struck, { maxLength: 1 })) },
  )
  .map(([counted, not]) => numbered([...counted, ...not]))
const overall = fc.oneof(
  { weight: 4, arbitrary: fc.constant([]) },
  {
    weight: 1,
    arbitrary: fc
      .array(
        reading.map((item) => ({ ...item, value: item.value * 2 })),
        { maxLength: 2 },
      )
      .map(numbered),
  },
)

const post = fc.record(
  {
    material: fc.constantFrom('softwood', 'softwood', 'hardwood', 'veneered', 'masonry', 'metal'),
    core: fc.constantFrom('softwood', 'hardwood'),
    cover: tape(0, 2),
    along: tape(3, 8),
    across: tape(2, 8),
  },
  { requiredKeys: ['material', 'along', 'across'] },
)

const slopes = fc.record(
  {
    kind: fc.constantFrom('level', 'level', 'level', 'stair'),
    taped: fc.constantFrom('slope', 'level'),
    rise: tape(4, 60),
    going: tape(8, 90),
    gauge: fc.double({ min: 0, max: 50, noNaN: true }),
    skewFrom: fc.integer({ min: -20, max: 20 }),
    skewTo: fc.integer({ min: -20, max: 20 }),
  },
  { requiredKeys: ['kind', 'taped'] },
)
const bay = fc.record({ slope: slopes, readings, backwards: fc.boolean() })

const layout = fc.oneof(
  fc.record({ layout: fc.constantFrom('even', 'fixed'), spacing: tape(2, 6) }),
  fc.record({ heights: fc.array(tape(1, 40), { minLength: 1, maxLength: 6 }) }),
)
const run = fc.record(
  {
    cable: fc.constantFrom('c18', 'c532', 'c316'),
    tension: fc.integer({ min: 100, max: 3000 }),
    cables: layout,
    readings: overall,
  },
  { requiredKeys: ['cable', 'cables'] },
)

const rules = fc
  .record({
    stacking: fc.constantFrom('rss', 'worst'),
    grouping: fc.constantFrom('cable', 'run'),
    tapeClass: fc.constantFrom('I', 'II', 'III', undefined),
    readingLimit: tape(0, 1),
    cutStep: fc.constantFrom(NM_PER_SIXTY_FOURTH, 4 * NM_PER_SIXTY_FOURTH, 1_000_000, 999_983),
    cutLimit: fc.constantFrom(0, 1_587_500),
    seatLimit: fc.constantFrom(0, 793_750),
    reserve: fc.double({ min: 0, max: 0.85, noNaN: true }),
  })
  .map((some) => makeHouseRulesSchema(storedQuantities).parse(some))

/** A row of posts, split into runs of one to four bays each written in either direction; some of it missing. */
const survey: fc.Arbitrary<Survey> = fc
  .array(fc.record({ run, bays: fc.array(bay, { minLength: 1, maxLength: 4 }) }), {
    minLength: 1,
    maxLength: 3,
  })
  .chain((runs) => {
    const bays = runs.flatMap((item) => item.bays)
    return fc.array(post, { minLength: bays.length + 1, maxLength: bays.length + 1 }).map((posts) => {
      const rowBays = bays.map(({ slope, readings: taken, backwards }, i) => {
        const ends = [`P${i}`, `P${i + 1}`]
        if (backwards) ends.reverse()
        return { id: `B${i}`, from: ends[0], to: ends[1], readings: taken, ...slope }
      })
      let next = 0
      const rowRuns = runs.map(({ run: more, bays: own }, i) => ({
        id: `R${i}`,
        bays: own.map(() => `B${next++}`),
        ...more,
      }))
      return surveySchema.parse({
        format: 'tautbook.survey',
        version: 1,
        units: { length: 'in', force: 'lbf' },
        title: 'Generated',
        posts: posts.map((item, i) => ({ id: `P${i}`, ...item })),
        bays: rowBays,
        runs: rowRuns,
      })
    })
  })

/** Surveys with the starter hardware and all manner of rules. */
export const generatedInput: fc.Arbitrary<CalculationInput> = fc
  .record({ survey, rules })
  .map((some) => ({ ...some, hardware: starterHardware }))
