import { isDeepStrictEqual } from 'node:util'
import fc from 'fast-check'
import { describe, expect, it, test } from 'vitest'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { invertOperation } from '@shared/survey/invert-operation'
import { OperationRefused } from '@shared/survey/operation-refused'
import {
  simpleOperationSchema,
  type SimpleOperation,
  type SurveyOperation,
  surveyOperationSchema,
} from '@shared/survey/survey-operation'
import { inches } from '@shared/units/length'
import { aBay, aPost, aRow, aRun, surveyOf } from '../../factories/survey'
import { fitting, fittingGroup, fittingRemoval, simpleKinds } from '../../support/operation-arbitrary'

function freeze<Thing>(thing: Thing): Thing {
  if (typeof thing === 'object' && thing !== null && !Object.isFrozen(thing)) {
    Object.freeze(thing)
    Object.values(thing).forEach(freeze)
  }
  return thing
}

/** The same, keys that are absent and keys called `constructor` included, which the runner's own matcher trips over. */
function expectSame(found: unknown, wanted: unknown): void {
  if (!isDeepStrictEqual(found, wanted))
    expect.fail(`${JSON.stringify(found)}\nis not\n${JSON.stringify(wanted)}`)
}

function restores({ survey, operation }: { survey: Survey; operation: SurveyOperation }): void {
  freeze(survey)
  freeze(operation)
  const changed = freeze(applyOperation(survey, operation))
  expectSame(surveySchema.parse(changed), changed)
  const opposite = freeze(invertOperation(survey, operation))
  expectSame(surveyOperationSchema.parse(JSON.parse(JSON.stringify(opposite))), opposite)
  const back = applyOperation(changed, opposite)
  expectSame(back, survey)
  // And redo is the opposite of undo.
  expectSame(applyOperation(back, invertOperation(changed, opposite)), changed)
}

describe('applying an operation and then its opposite brings back any survey', () => {
  it('is tested for every kind of operation there is', () => {
    expect([...simpleKinds].sort()).toEqual(
      simpleOperationSchema.options.map(({ shape }) => shape.type.value).sort(),
    )
  })
  test.each(simpleKinds)('%s', { timeout: 60_000 }, (kind) => {
    fc.assert(fc.property(fitting(kind), restores), { numRuns: 60 })
  })
  test('groups', { timeout: 60_000 }, () => {
    fc.assert(fc.property(fittingGroup, restores), { numRuns: 150 })
  })
  test('removals with all that hangs on them', { timeout: 60_000 }, () => {
    fc.assert(fc.property(fittingRemoval, restores), { numRuns: 200 })
  })
})

const survey = aRow([48, 47], {
  runs: [aRun('R1', ['B1', 'B2'])],
  corners: [{ post: 'P1', angle: 90 }],
  photos: [{ id: 'F1', file: 'deck.jpg', posts: { P1: { base: [1, 2] } } }],
})

describe('what an operation leaves alone', () => {
  it('is shared with the survey before, and that is as it was', () => {
    const before = structuredClone(survey)
    const changed = applyOperation(survey, {
      type: 'post.set',
      id: 'P2',
      set: { material: 'metal' },
      unset: ['across'],
    })
    expect(survey).toStrictEqual(before)
    expect(changed.posts[1]).toStrictEqual({ id: 'P2', material: 'metal', along: inches(3.5) })
    expect(changed.posts[0]).toBe(survey.posts[0])
    expect(changed.bays).toBe(survey.bays)
    expect(changed.photos).toBe(survey.photos)
  })

  it('puts what is added at its index, or last', () => {
    const add = (index?: number): SurveyOperation => ({ type: 'post.add', post: { id: 'N' }, index })
    const order = (operation: SurveyOperation) => applyOperation(survey, operation).posts.map(({ id }) => id)
    expect(order(add(1))).toEqual(['P1', 'N', 'P2', 'P3'])
    expect(order(add())).toEqual(['P1', 'P2', 'P3', 'N'])
  })

  it('keeps the order of a group that is undone', () => {
    const operation: SurveyOperation = {
      type: 'group',
      operations: [
        { type: 'run.remove', id: 'R1' },
        { type: 'bay.remove', id: 'B1' },
      ],
    }
    expect(invertOperation(survey, operation)).toEqual({
      type: 'group',
      operations: [
        { type: 'bay.add', bay: survey.bays[0], index: 0 },
        { type: 'run.add', run: survey.runs[0], index: 0 },
      ],
    })
  })
})

describe('what does not fit is refused', () => {
  const of = { kind: 'bay' as const, id: 'B1' }
  it.each<[string, string, SimpleOperation]>([
    ['not-there', 'no post P9', { type: 'post.remove', id: 'P9' }],
    ['not-there', 'no bay B9', { type: 'bay.set', id: 'B9', set: { spacers: 1 }, unset: [] }],
    ['not-there', 'no reading r9', { type: 'reading.strike', of, id: 'r9', reason: 'misread' }],
    ['not-there', 'not struck', { type: 'reading.restore', of, id: 'r1' }],
    ['not-there', 'P2 has no corner angle', { type: 'corner.remove', post: 'P2' }],
    ['not-there', 'P2 is not marked on photo F1', { type: 'photo.unmark', photo: 'F1', post: 'P2' }],
    ['not-there', 'constructor is not marked', { type: 'photo.unmark', photo: 'F1', post: 'constructor' }],
    ['already-there', 'a post P1', { type: 'post.add', post: { id: 'P1' } }],
    ['still-used', 'The post P2 is still used by bay B1', { type: 'post.remove', id: 'P2' }],
    ['still-used', 'The bay B1 is still used by run R1', { type: 'bay.remove', id: 'B1' }],
    ['not-fitting', 'run R1 names B9', { type: 'run.set', id: 'R1', set: { bays: ['B9'] }, unset: [] }],
    ['not-fitting', 'bay B1 names P1', { type: 'bay.set', id: 'B1', set: { to: 'P1' }, unset: [] }],
  ])('%s: %s', (code, sentence, operation) => {
    const attempt = () => applyOperation(survey, operation)
    expect(attempt).toThrow(OperationRefused)
    expect(attempt).toThrow(
      expect.objectContaining({ code, message: expect.stringContaining(sentence) as string }),
    )
  })

  it('a reading that is struck is not struck again', () => {
    const strike: SurveyOperation = { type: 'reading.strike', of, id: 'r1', reason: 'misread' }
    const struck = applyOperation(survey, strike)
    expect(struck.bays[0]?.readings[0]).toMatchObject({ value: inches(48), struck: 'misread' })
    expect(() => applyOperation(struck, strike)).toThrow(expect.objectContaining({ code: 'already-there' }))
  })

  it('a group is applied whole or not at all, and judged by what it leaves', () => {
    const swap: SurveyOperation = {
      type: 'group',
      operations: [
        { type: 'bay.remove', id: 'B2' },
        { type: 'run.set', id: 'R1', set: { bays: ['B1'] }, unset: [] },
      ],
    }
    expect(applyOperation(survey, swap).runs[0]?.bays).toEqual(['B1'])
    const half: SurveyOperation = { type: 'group', operations: [swap.operations[0]!] }
    expect(() => applyOperation(survey, half)).toThrow(expect.objectContaining({ code: 'still-used' }))
  })

  it('more posts than a survey may have', () => {
    const full = surveyOf({ posts: Array.from({ length: 1000 }, (_, i) => aPost(`P${i}`)) })
    expect(() => applyOperation(full, { type: 'post.add', post: { id: 'N' } })).toThrow(/at most 1000 posts/)
  })
})

describe('the operation schema', () => {
  const refused = (operation: unknown) => surveyOperationSchema.safeParse(operation).success === false

  it('takes no readings in a change of a bay or a run', () => {
    expect(refused({ type: 'bay.set', id: 'B1', set: { readings: [] }, unset: [] })).toBe(true)
    expect(refused({ type: 'run.set', id: 'R1', set: { readings: [] }, unset: [] })).toBe(true)
    expect(refused({ type: 'bay.set', id: 'B1', set: { spacers: 1 }, unset: [] })).toBe(false)
  })

  it('takes away only what may be absent, and changes no id', () => {
    expect(refused({ type: 'bay.set', id: 'B1', set: {}, unset: ['kind'] })).toBe(true)
    expect(refused({ type: 'bay.set', id: 'B1', set: {}, unset: ['rise'] })).toBe(false)
    expect(refused({ type: 'post.set', id: 'P1', set: { id: 'P2' }, unset: [] })).toBe(true)
  })

  it('fills no default into a change', () => {
    const parsed = surveyOperationSchema.parse({ type: 'bay.set', id: 'B1', set: { rise: 5 } })
    expect(parsed).toStrictEqual({ type: 'bay.set', id: 'B1', set: { rise: 5 }, unset: [] })
  })

  it('wants a reason for striking and at least one step in a group', () => {
    const of = { kind: 'bay', id: 'B1' }
    expect(refused({ type: 'reading.strike', of, id: 'r1', reason: '  ' })).toBe(true)
    expect(refused({ type: 'group', operations: [] })).toBe(true)
    expect(refused({ type: 'group', operations: [{ type: 'group', operations: [] }] })).toBe(true)
    expect(refused({ type: 'bay.rename', id: 'B1' })).toBe(true)
  })

  it('takes whole nanometres only', () => {
    expect(refused({ type: 'post.add', post: { id: 'P1', along: 3.5 } })).toBe(true)
    expect(refused({ type: 'bay.add', bay: aBay('B1', ['P1', 'P2']) })).toBe(false)
  })
})
