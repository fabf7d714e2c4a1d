import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { allFindings } from '@shared/calculation/all-findings'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { checkSurvey, type SurveyChecks } from '@shared/calculation/checks/check-survey'
import { publishedRules } from '@shared/calculation/guard-rules/published-rules'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { inches } from '@shared/units/length'

const SURVEYS = 500
const maybe = <Value>(arbitrary: fc.Arbitrary<Value>) => fc.option(arbitrary, { nil: undefined, freq: 4 })
const length = (least: number, most: number) =>
  fc.double({ min: least, max: most, noNaN: true }).map((value) => inches(value))

const post = fc.record({
  material: maybe(fc.constantFrom('softwood', 'hardwood', 'veneered', 'masonry', 'metal')),
  core: maybe(fc.constantFrom('softwood', 'hardwood', 'masonry', 'metal')),
  cover: maybe(length(0, 2)),
  along: maybe(length(1, 12)),
  across: maybe(length(1, 12)),
  railTies: maybe(fc.boolean()),
})
const bay = fc.record({
  kind: fc.constantFrom('level', 'stair'),
  taped: fc.constantFrom('slope', 'level'),
  rise: maybe(length(3, 120)),
  going: maybe(length(3, 120)),
  gauge: maybe(fc.integer({ min: 0, max: 80 })),
  spacers: fc.integer({ min: 0, max: 3 }),
  readings: fc.array(length(1, 300), { maxLength: 2 }),
})
const run = fc.record({
  cable: fc.constantFrom(...starterHardware.cables.map(({ id }) => id)),
  tension: maybe(fc.double({ min: 1, max: 20_000, noNaN: true })),
  cables: fc.oneof(
    fc.record({ layout: fc.constantFrom('even', 'fixed'), spacing: length(1, 60) }),
    fc.record({ heights: fc.array(length(0.1, 60), { minLength: 1, maxLength: 6 }) }),
  ),
})
const anySurvey = fc
  .record({
    posts: fc.array(post, { minLength: 4, maxLength: 4 }),
    bays: fc.array(bay, { minLength: 3, maxLength: 3 }),
    runs: fc.array(run, { minLength: 2, maxLength: 2 }),
    corner: maybe(fc.integer({ min: 1, max: 180 })),
    rules: fc.constantFrom('nowhere', ...publishedRules.map(({ id }) => id)),
    fall: maybe(length(0, 300)),
    height: length(1, 60),
  })
  .map((given): Survey => {
    const readings = (values: number[]) =>
      values.map((value, i) => ({ id: `r${i}`, at: i === 0 ? 'top' : 'bottom', value }))
    const [first, second] = given.runs
    return surveySchema.parse({
      format: 'tautbook.survey',
      version: 1,
      units: { length: 'in', force: 'lbf' },
      title: 'Any',
      guard: { rules: given.rules, height: given.height, fall: given.fall },
      posts: given.posts.map((fields, i) => ({ id: `P${i}`, ...fields })),
      bays: given.bays.map((fields, i) => ({
        id: `B${i}`,
        from: `P${i}`,
        to: `P${i + 1}`,
        ...fields,
        readings: readings(fields.readings),
      })),
      runs: [
        { id: 'R0', bays: ['B0', 'B1'], ...first },
        { id: 'R1', bays: ['B2'], ...second },
      ],
      corners: given.corner === undefined ? [] : [{ post: 'P2', angle: given.corner }],
    })
  })

const inputOf = (survey: Survey): CalculationInput => ({
  survey,
  hardware: starterHardware,
  rules: starterRules,
})

/** Every number anywhere in the figures, with the keys that lead to it. */
function numbersIn(value: unknown, path = ''): [string, number][] {
  if (typeof value === 'number') return [[path, value]]
  if (typeof value !== 'object' || value === null) return []
  return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, `${path}.${key}`))
}
const figuresOf = ({ runs, bays, posts, corners }: SurveyChecks) => ({ runs, bays, posts, corners })
/** What may lie below zero: a hole's wood left, an overlap that is none, an opening a cable closes, a slack cable. */
const maybeNegative = /overlap|backLeft|edgeLeft|openings|whenHot|cutPastFace|triangle/

/** The readings and sizes a run cannot be checked without, and the code that says so. */
function missingOf({ bays, posts, runs }: Survey): { run: string; code: string }[] {
  return runs.flatMap((each) => {
    const own = bays.filter(({ id }) => each.bays.includes(id))
    const ends = [own[0]?.from, own.at(-1)?.to]
    return [
      ...own.filter(({ readings }) => readings.length === 0).map(() => 'missing-reading'),
      ...own
        .filter(
          ({ kind, rise, going, gauge }) =>
            kind === 'stair' && gauge === undefined && (rise === undefined || going === undefined),
        )
        .map(() => 'missing-angle'),
      ...posts
        .filter(({ id, material }) => ends.includes(id) && material === undefined)
        .map(() => 'missing-material'),
    ].map((code) => ({ run: each.id, code }))
  })
}

describe(`${SURVEYS} surveys of any kind`, () => {
  it('never give a figure that is no number, nor a length below zero', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const checks = checkSurvey(inputOf(survey))
        for (const [path, value] of numbersIn(figuresOf(checks))) {
          // No hole of two runs at one post: infinitely far apart.
          if (path.endsWith('.apart')) continue
          expect(Number.isFinite(value), path).toBe(true)
          if (!maybeNegative.test(path)) expect(value, path).toBeGreaterThanOrEqual(0)
        }
        for (const { text, rule = '' } of checks.findings) {
          expect(`${text} ${rule}`).not.toMatch(/NaN|undefined|Infinity|null/)
        }
      }),
      { numRuns: SURVEYS },
    )
  })

  it('never lose a finding for what is missing', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const input = inputOf(survey)
        const checks = checkSurvey(input)
        for (const { run: id, code } of missingOf(survey)) {
          const said = checks.findings.filter(({ where }) => where.run === id).map((finding) => finding.code)
          expect(said).toContain(code)
          const all = allFindings(calculateSurvey(input), checks)
          expect(all.some((finding) => finding.code === code && finding.where.run === id)).toBe(true)
        }
      }),
      { numRuns: SURVEYS },
    )
  })

  it('leave no run out without a *stop* that says why', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const { runs, findings } = checkSurvey(inputOf(survey))
        for (const { id } of survey.runs) {
          if (runs.some(({ run: checked }) => checked === id)) continue
          expect(findings.some(({ level, where }) => level === 'stop' && where.run === id)).toBe(true)
        }
      }),
      { numRuns: SURVEYS },
    )
  })

  it('say each thing once', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const { findings } = checkSurvey(inputOf(survey))
        expect(new Set(findings.map(({ text }) => text)).size).toBe(findings.length)
      }),
      { numRuns: 100 },
    )
  })
})
