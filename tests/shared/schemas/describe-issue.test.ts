import { describe, expect, it } from 'vitest'
import { z } from 'zod'
import { describeIssues } from '@shared/schemas/describe-issue'

const point = z.tuple([z.number(), z.number()])
const schema = z.strictObject({
  flag: z.boolean().optional(),
  count: z.int().max(5).optional(),
  name: z.string().min(1).max(3).optional(),
  list: z.array(z.number()).max(2).optional(),
  point: point.optional(),
  angle: z.number().lt(90).multipleOf(5).optional(),
  marks: z.record(z.string().regex(/^P/, 'expected the id of a post'), z.number()).optional(),
  cables: z
    .union([
      z.strictObject({ layout: z.enum(['even', 'fixed']), spacing: z.number() }),
      z.strictObject({ heights: z.array(z.number()) }),
    ])
    .optional(),
  by: z
    .discriminatedUnion('kind', [
      z.strictObject({ kind: z.literal('bay') }),
      z.strictObject({ kind: z.literal('run') }),
    ])
    .optional(),
})
const faultsOf = (input: unknown) => {
  const parsed = schema.safeParse(input)
  return parsed.success ? [] : describeIssues(parsed.error.issues, input)
}

describe('a fault', () => {
  it.each<[unknown, string]>([
    [7, 'the file: found 7, expected an object in { }'],
    [{ flag: 'yes' }, 'flag: found "yes", expected true or false'],
    [{ count: 1.5 }, 'count: found 1.5, expected a whole number'],
    [{ count: 6 }, 'count: found 6, expected a number at most 5'],
    [{ name: 3 }, 'name: found 3, expected text'],
    [{ name: '' }, 'name: found "", expected text of at least 1 character'],
    [{ name: 'long' }, 'name: found "long", expected text of at most 3 characters'],
    [{ list: [1, 2, 3] }, 'list: found [1,2,3], expected a list of at most 2 entries'],
    [{ list: [1, null] }, 'list[1]: found null, expected a number'],
    [{ point: [1] }, 'point: found [1], expected a list of at least 2 entries'],
    [{ point: { x: 1 } }, 'point: found {"x":1}, expected a list in [ ]'],
    [{ angle: 90 }, 'angle: found 90, expected a number below 90'],
    [{ angle: 7 }, 'angle: found 7, expected a multiple of 5'],
    [{ marks: { Q: 1 } }, 'marks.Q: found "Q", expected the id of a post'],
    [{ by: { kind: 'post' } }, 'by.kind: found "post", expected one of "bay", "run"'],
  ])('of %j is one sentence of path, value and expectation', (input, sentence) => {
    expect(faultsOf(input)).toEqual([sentence])
  })

  it('of a value of several shapes is that of the shape it comes closest to', () => {
    expect(faultsOf({ cables: { layout: 'odd', spacing: 3 } })).toEqual([
      'cables.layout: found "odd", expected one of "even", "fixed"',
    ])
    expect(faultsOf({ cables: { heights: ['low'] } })).toEqual([
      'cables.heights[0]: found "low", expected a number',
    ])
    expect(faultsOf({ cables: 3 })).toEqual(['cables: found 3, expected an object in { }'])
  })

  it('shows the beginning of a long value', () => {
    const [sentence] = faultsOf({ count: 'x'.repeat(500) })
    expect(sentence).toBe(`count: found "${'x'.repeat(56)}…, expected a number`)
  })
})
