import { Ajv2020 } from 'ajv/dist/2020.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { quantitiesIn } from '@shared/schemas/quantities'
import { makeSurveyFileSchema, surveyFileJsonSchema } from '@shared/schemas/survey-file'
import { sample, sampleWith } from './support/sample'

const units = { length: 'in', force: 'lbf' } as const
// The date-time pattern stands beside its format, which this validator knows only with a second package.
const validate = new Ajv2020({ strict: true, validateFormats: false }).compile(
  surveyFileJsonSchema(units) as object,
)
const schema = makeSurveyFileSchema(quantitiesIn(units))

/**
 * Whether the program takes a document as far as its shape goes. That every name leads somewhere, and that a length is
 * no less than a nanometre, JSON Schema cannot say.
 */
function hasShape(input: unknown): boolean {
  const parsed = schema.safeParse(input)
  return (
    parsed.success ||
    parsed.error.issues.every(
      ({ code, message }) => code === 'custom' || message === 'expected a length above zero',
    )
  )
}

type Path = (string | number)[]
function pathsOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path]
  const entries: [string | number, unknown][] = Array.isArray(value)
    ? [...(value as unknown[]).entries()]
    : Object.entries(value)
  return [path, ...entries.flatMap(([key, part]) => pathsOf(part, [...path, key]))]
}
const paths = pathsOf(sample).filter((path) => path.length > 0)

describe('the published JSON Schema', { timeout: 60_000 }, () => {
  it('is a JSON Schema of 2020-12 that takes the sample', () => {
    expect(surveyFileJsonSchema(units)).toHaveProperty(
      '$schema',
      'https://json-schema.org/draft/2020-12/schema',
    )
    expect(validate(sample), JSON.stringify(validate.errors)).toBe(true)
    expect(hasShape(sample)).toBe(true)
  })

  it('takes and refuses the absence of each key as the program does', () => {
    const differing = paths.filter((path) => {
      const input = sampleWith(path, undefined)
      return validate(JSON.parse(JSON.stringify(input))) !== hasShape(JSON.parse(JSON.stringify(input)))
    })
    expect(differing).toEqual([])
    expect(validate(sampleWith(['survey', 'title'], undefined))).toBe(false)
    expect(validate(sampleWith(['survey', 'guard'], undefined))).toBe(true)
  })

  it('refuses a key it does not know, in every object that is no list of names', () => {
    const objects = paths.filter(
      (path) => typeof path.at(-1) === 'string' && !path.includes('minGrip') && path.at(-2) !== 'posts',
    )
    const parents = new Set(objects.map((path) => JSON.stringify(path.slice(0, -1))))
    expect(parents.size).toBeGreaterThan(15)
    for (const parent of parents) {
      const path = [...(JSON.parse(parent) as Path), 'unheardOf']
      expect(validate(sampleWith(path, 1)), parent).toBe(false)
      expect(hasShape(sampleWith(path, 1)), parent).toBe(false)
    }
  })

  it('takes and refuses whatever is put anywhere as the program does', () => {
    const values = fc.oneof(
      fc.constantFrom(
        null,
        true,
        '',
        'P1',
        'level',
        'stair',
        'in',
        'P 1',
        -1,
        0,
        0.5,
        1,
        3,
        81,
        90,
        181,
        1e6,
        1e13,
        '2026-05-04',
      ),
      fc.constantFrom(
        '2026-05-04T10:12:00Z',
        '2026-02-30T10:12:00Z',
        '2026-05-04T10:12:00+02:00',
        ' ',
        'x'.repeat(130),
      ),
      fc.constantFrom(
        {},
        [],
        [0, 0],
        [0, 0, 0],
        [1],
        { base: [0, 0] },
        { heights: [] },
        { heights: [3] },
        { layout: 'even', spacing: 3 },
      ),
      fc.jsonValue(),
    )
    let refused = 0
    fc.assert(
      fc.property(fc.constantFrom(...paths), values, (path, value) => {
        const input = sampleWith(path, value as never)
        const taken = validate(input)
        if (!taken) refused += 1
        expect(taken).toBe(hasShape(input))
      }),
      { numRuns: 3000 },
    )
    expect(refused).toBeGreaterThan(500)
    expect(refused).toBeLessThan(3000)
  })
})
