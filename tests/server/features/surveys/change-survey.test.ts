import { randomUUID } from 'node:crypto'
import { and, eq } from 'drizzle-orm'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { surveySchema } from '@shared/schemas/survey'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { inches } from '@shared/units/length'
import { surveyChanges, surveys } from '../../../../server/database/tables/surveys'
import { stockCompany } from '../../../../server/features/hardware/hardware.service'
import { changeSurvey } from '../../../../server/features/surveys/change-survey.service'
import { readHistory, readSurvey } from '../../../../server/features/surveys/surveys.service'
import { createPerson, type PersonRow } from '../../../factories/person'
import { createSurveyRow, type SurveyRow } from '../../../factories/survey-record'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'

let test: TestDatabase
beforeAll(async () => {
  test = await openTestDatabase()
})
afterAll(() => test.close())

let person: PersonRow
let row: SurveyRow
const now = new Date('2026-05-14T10:00:00.000Z')
const key = () => ({ companyId: row.companyId, surveyId: row.id })

beforeEach(async () => {
  await test.reset()
  person = await createPerson(test.database, { name: 'Imre' })
  row = await createSurveyRow(test.database, { companyId: person.companyId })
})

const change = (operation: SurveyOperation, id: string = randomUUID()) => ({ id, operation })
const post = (id: string): SurveyOperation => ({ type: 'post.add', post: { id } })
const bay: SurveyOperation = {
  type: 'bay.add',
  bay: {
    id: 'B1',
    from: 'P1',
    to: 'P2',
    kind: 'level',
    spacers: 0,
    skewFrom: 0,
    skewTo: 0,
    taped: 'slope',
    readings: [],
  },
}
const reading: SurveyOperation = {
  type: 'reading.add',
  of: { kind: 'bay', id: 'B1' },
  reading: { id: 'r1', at: 'top', value: inches(46.5), by: 'Somebody else', on: '2030-01-01T00:00:00Z' },
}

const send = (revision: number, changes: { id: string; operation: SurveyOperation }[]) =>
  changeSurvey(test.database, { survey: key(), person, revision, changes, now })
const stored = async () => (await readSurvey(test.database, key())).survey
const historyOf = async () =>
  (await readHistory(test.database, key(), { limit: 100 })).entries.map(({ revision }) => revision)

describe('changes of a survey', () => {
  it('are applied in order, one revision each, and kept in the history', async () => {
    expect(await send(0, [change(post('P1')), change(post('P2')), change(bay)])).toEqual({ revision: 3 })
    const survey = await stored()
    expect(survey.posts.map(({ id }) => id)).toEqual(['P1', 'P2'])
    expect(survey.bays).toHaveLength(1)
    const { entries } = await readHistory(test.database, key(), { limit: 100 })
    expect(entries.map(({ revision, by, at, operation }) => [revision, by, at, operation.type])).toEqual([
      [3, 'Imre', '2026-05-14T10:00:00.000Z', 'bay.add'],
      [2, 'Imre', '2026-05-14T10:00:00.000Z', 'post.add'],
      [1, 'Imre', '2026-05-14T10:00:00.000Z', 'post.add'],
    ])
  })

  it('leave beside the document what lists show', async () => {
    await send(0, [change(post('P1')), change(post('P2')), change(bay)])
    const [after] = await test.database.select().from(surveys).where(eq(surveys.id, row.id))
    expect(after).toMatchObject({ posts: 2, bays: 1, revision: 3 })
    expect(after!.gaps).toBeGreaterThan(0)
    expect(after!.updatedAt > row.updatedAt).toBe(true)
  })

  it('are all refused when one does not fit', async () => {
    await expect(send(0, [change(post('P1')), change(bay)])).rejects.toMatchObject({
      status: 422,
      code: 'operation-not-fitting',
    })
    expect((await stored()).posts).toEqual([])
    expect(await historyOf()).toEqual([])
  })

  it('carry the sender’s name and a moment that is not in the future, whatever they say', async () => {
    await send(0, [change(post('P1')), change(post('P2')), change(bay), change(reading)])
    expect((await stored()).bays[0]?.readings).toEqual([
      { id: 'r1', at: 'top', value: inches(46.5), by: 'Imre', on: '2026-05-14T10:00:00.000Z' },
    ])
    const [newest] = (await readHistory(test.database, key(), { limit: 1 })).entries
    expect(JSON.stringify(newest?.operation)).not.toContain('Somebody else')
  })

  it('give a removed bay its readings back by undo, with who took them', async () => {
    await send(0, [change(post('P1')), change(post('P2')), change(bay), change(reading)])
    const taken = (await stored()).bays[0]!
    const other = await createPerson(test.database, { companyId: person.companyId, name: 'Odile' })
    await changeSurvey(test.database, {
      survey: key(),
      person: other,
      revision: 4,
      changes: [change({ type: 'bay.remove', id: 'B1' }), change({ type: 'bay.add', bay: taken })],
      now: new Date('2026-05-15T10:00:00.000Z'),
    })
    expect((await stored()).bays[0]).toEqual(taken)
  })

  it('never let one person alter what another has read, by taking it back and giving it again', async () => {
    await send(0, [change(post('P1')), change(post('P2')), change(bay), change(reading)])
    const other = await createPerson(test.database, { companyId: person.companyId, name: 'Odile' })
    const asOther = (operation: SurveyOperation) =>
      changeSurvey(test.database, {
        survey: key(),
        person: other,
        revision: 4,
        changes: [change(operation)],
        now,
      })
    const of = { kind: 'bay', id: 'B1' } as const
    await expect(asOther({ type: 'reading.retract', of, id: 'r1' })).rejects.toMatchObject({
      code: 'not-your-reading',
    })
    const altered = {
      ...(await stored()).bays[0]!,
      readings: [{ id: 'r1', at: 'top' as const, value: inches(64.5) }],
    }
    const group = [{ type: 'bay.remove', id: 'B1' } as const, { type: 'bay.add', bay: altered } as const]
    await expect(asOther({ type: 'group', operations: group })).rejects.toMatchObject({
      code: 'reading-changed',
    })
    expect((await stored()).bays[0]?.readings).toMatchObject([{ id: 'r1', value: inches(46.5), by: 'Imre' }])
    // Its taker may: undo, and another reading under another id.
    expect(await send(4, [change({ type: 'reading.retract', of, id: 'r1' })])).toEqual({ revision: 5 })
  })

  it('let a stop pass only for an owner or estimator, under their own name', async () => {
    const overrule: SurveyOperation = {
      type: 'stop.overrule',
      overrule: {
        code: 'guard-too-low',
        where: {},
        text: 'Too low.',
        reason: 'A wall stands there',
        by: 'Odile',
      },
    }
    const surveyor = await createPerson(test.database, { companyId: person.companyId, roles: ['surveyor'] })
    const estimator = await createPerson(test.database, {
      companyId: person.companyId,
      name: 'Tamsin',
      roles: ['estimator'],
    })
    const as = (who: PersonRow, operation: SurveyOperation, revision = 0) =>
      changeSurvey(test.database, { survey: key(), person: who, revision, changes: [change(operation)], now })
    for (const operation of [overrule, { type: 'group', operations: [overrule] } as SurveyOperation]) {
      await expect(as(surveyor, operation)).rejects.toMatchObject({ status: 403, code: 'may-not-overrule' })
    }
    await as(estimator, overrule)
    expect((await stored()).overruled).toMatchObject([{ by: 'Tamsin', on: now.toISOString() }])
    const uphold: SurveyOperation = { type: 'stop.uphold', code: 'guard-too-low', where: {} }
    await expect(as(surveyor, uphold, 1)).rejects.toMatchObject({ code: 'may-not-overrule' })
    await as(estimator, uphold, 1)
    expect((await stored()).overruled).toEqual([])
  })

  it('may not give a run a cable that the company lacks', async () => {
    await stockCompany(person.companyId, test.database)
    await send(0, [change(post('P1')), change(post('P2')), change(bay)])
    const run = (cable: string): SurveyOperation => ({
      type: 'run.add',
      run: { id: 'R1', bays: ['B1'], cable, readings: [], cables: { layout: 'even', spacing: inches(3) } },
    })
    await expect(send(3, [change(run('c999'))])).rejects.toMatchObject({ code: 'cable-not-in-catalogue' })
    expect(await send(3, [change(run('c532'))])).toEqual({ revision: 4 })
  })
})

describe('a change sent again', () => {
  it('is done once', async () => {
    const changes = [change(post('P1')), change(post('P2'))]
    await send(0, changes)
    expect(await send(0, changes)).toEqual({ revision: 2 })
    expect(await historyOf()).toEqual([2, 1])
  })

  it('is skipped where others follow it', async () => {
    const first = change(post('P1'))
    await send(0, [first])
    expect(await send(0, [first, change(post('P2'))])).toEqual({ revision: 2 })
    expect((await stored()).posts.map(({ id }) => id)).toEqual(['P1', 'P2'])
  })

  it('is done once where one request names it twice', async () => {
    const first = change(post('P1'))
    expect(await send(0, [first, first])).toEqual({ revision: 1 })
  })

  it('of another survey is another change', async () => {
    const first = change(post('P1'))
    await send(0, [first])
    const other = await createSurveyRow(test.database, { companyId: person.companyId })
    const survey = { companyId: other.companyId, surveyId: other.id }
    await changeSurvey(test.database, { survey, person, revision: 0, changes: [first], now })
    expect((await readSurvey(test.database, survey)).survey.posts).toHaveLength(1)
  })
})

describe('a survey that has moved on', () => {
  it('refuses with its present revision and changes nothing', async () => {
    await send(0, [change(post('P1'))])
    await expect(send(0, [change(post('P2'))])).rejects.toMatchObject({
      status: 409,
      code: 'survey-moved',
      fields: [{ path: 'revision', message: '1' }],
    })
    await expect(send(5, [change(post('P2'))])).rejects.toMatchObject({ code: 'survey-moved' })
    expect((await stored()).posts).toHaveLength(1)
  })

  it('refuses a repeated request when somebody else came between', async () => {
    const mine = change(post('P1'))
    await send(0, [mine])
    await send(1, [change(post('P2'))])
    await expect(send(0, [mine, change(post('P3'))])).rejects.toMatchObject({ code: 'survey-moved' })
  })

  it('takes exactly one of many sent at once', async () => {
    const tries = ['P1', 'P2', 'P3', 'P4'].map((id) => send(0, [change(post(id))]))
    const settled = await Promise.allSettled(tries)
    expect(settled.filter(({ status }) => status === 'fulfilled')).toHaveLength(1)
    expect((await stored()).posts).toHaveLength(1)
    expect(await historyOf()).toEqual([1])
  })
})

describe('the history', () => {
  it('comes page by page, the newest first', async () => {
    await send(
      0,
      ['P1', 'P2', 'P3', 'P4', 'P5'].map((id) => change(post(id))),
    )
    const first = await readHistory(test.database, key(), { limit: 2 })
    expect(first.entries.map(({ revision }) => revision)).toEqual([5, 4])
    const second = await readHistory(test.database, key(), { limit: 3, before: first.next! })
    expect((await readHistory(test.database, key(), { limit: 9, before: 1e15 })).entries).toHaveLength(5)
    expect(second).toMatchObject({ entries: [{ revision: 3 }, { revision: 2 }, { revision: 1 }], next: null })
  })

  it('makes the survey again when applied to an empty one', async () => {
    const { applyOperation } = await import('@shared/survey/apply-operation')
    await send(0, [change(post('P1')), change(post('P2')), change(bay), change(reading)])
    const { entries } = await readHistory(test.database, key(), { limit: 100 })
    const again = entries
      .toReversed()
      .reduce((survey, { operation }) => applyOperation(survey, operation), surveySchema.parse(row.document))
    expect(again).toEqual(await stored())
  })

  it('only ever grows', async () => {
    await send(0, [change(post('P1')), change({ type: 'post.remove', id: 'P1' })])
    const rows = await test.database
      .select()
      .from(surveyChanges)
      .where(and(eq(surveyChanges.companyId, row.companyId), eq(surveyChanges.surveyId, row.id)))
    expect(rows).toHaveLength(2)
  })
})
