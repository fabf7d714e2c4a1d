import { describe, expect, it } from 'vitest'
import type { Reading } from '@shared/schemas/bay'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { inches } from '@shared/units/length'
import { KnownReadings } from '../../../../server/features/surveys/known-readings'
import { stampReadings } from '../../../../server/features/surveys/stamp-readings'

const now = new Date('2026-05-14T10:00:00Z')
const of = { kind: 'bay', id: 'B1' } as const
const reading = (more: Partial<Reading> = {}): Reading => ({
  id: 'r1',
  at: 'top',
  value: inches(46.5),
  ...more,
})
const add = (more: Partial<Reading> = {}): SurveyOperation => ({
  type: 'reading.add',
  of,
  reading: reading(more),
})
const bayWith = (...readings: Reading[]): SurveyOperation => ({
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
    readings,
  },
})

const imre = { id: 'imre', name: 'Imre' }
/** What Imre sends; the history is Odile’s. */
const stamp = (operation: SurveyOperation, history: SurveyOperation[] = [], person = imre) =>
  stampReadings(operation, {
    person,
    now,
    known: new KnownReadings(history.map((each) => ({ operation: each, personId: 'odile' }))),
  })
const refusal = (act: () => unknown): unknown => {
  try {
    act()
  } catch (error) {
    return error
  }
  return undefined
}
const stampedReading = (operation: SurveyOperation) => {
  const stamped = stamp(operation)
  if (stamped.type !== 'reading.add') throw new Error('not a reading')
  return stamped.reading
}

describe('who and when on an added reading', () => {
  it('are the sender and the server’s clock where nothing is said', () => {
    expect(stampedReading(add())).toMatchObject({ by: 'Imre', on: '2026-05-14T10:00:00.000Z' })
  })

  it('never another person', () => {
    expect(stampedReading(add({ by: 'Odile', on: '2026-05-14T09:00:00Z' }))).toMatchObject({
      by: 'Imre',
      on: '2026-05-14T09:00:00.000Z',
    })
  })

  it('never the future, by whatever clock it is told', () => {
    expect(stampedReading(add({ on: '2026-05-14T10:00:01Z' })).on).toBe('2026-05-14T10:00:00.000Z')
    expect(stampedReading(add({ on: '2026-05-14T06:00:00-05:00' })).on).toBe('2026-05-14T10:00:00.000Z')
    expect(stampedReading(add({ on: '2026-05-14T11:00:00+02:00' })).on).toBe('2026-05-14T09:00:00.000Z')
  })

  it('inside a group, a bay and a run as well', () => {
    const run: SurveyOperation = {
      type: 'run.add',
      run: {
        id: 'R1',
        bays: ['B1'],
        cable: 'c1',
        readings: [reading({ by: 'Odile' })],
        cables: { layout: 'even', spacing: inches(3) },
      },
    }
    const group = stamp({
      type: 'group',
      operations: [add({ id: 'r0', by: 'Odile' }), bayWith(reading({ by: 'Odile' })), run] as never,
    })
    expect(JSON.stringify(group)).not.toContain('Odile')
    expect(JSON.stringify(group).match(/"by":"Imre"/g)).toHaveLength(3)
  })
})

describe('a reading that comes back by undo', () => {
  const theirs = reading({ by: 'Odile', on: '2026-05-01T08:00:00.000Z' })

  it('keeps who took it, since the history holds it', () => {
    const again = stamp(bayWith(theirs), [add(theirs)])
    expect(again).toEqual(bayWith(theirs))
    expect(stamp(bayWith({ ...theirs, struck: 'digits swapped' }), [add(theirs)])).toEqual(
      bayWith({ ...theirs, struck: 'digits swapped' }),
    )
  })

  it('comes back as it was taken, whatever moment and name it is given now', () => {
    const again = stamp(bayWith({ ...theirs, by: 'Imre', on: '2026-05-02T08:00:00.000Z' }), [add(theirs)])
    expect(again).toEqual(bayWith(theirs))
  })

  it.each([
    ['another figure', { value: inches(64.5) }],
    ['another place', { at: 'bottom' as const }],
  ])('is refused with %s: a reading is struck, never altered', (_what, more) => {
    for (const operation of [add({ ...theirs, ...more }), bayWith({ ...theirs, ...more })]) {
      expect(refusal(() => stamp(operation, [add(theirs)]))).toMatchObject({
        status: 422,
        code: 'reading-changed',
      })
    }
  })

  it('is refused with another figure within one gesture as well', () => {
    const gesture = { type: 'group', operations: [add(), add({ value: inches(64.5) })] } as SurveyOperation
    expect(refusal(() => stamp(gesture))).toMatchObject({ code: 'reading-changed' })
  })
})

describe('taking a reading back', () => {
  const back: SurveyOperation = { type: 'reading.retract', of, id: 'r1' }

  it('is for who took it', () => {
    expect(stamp(back, [add()], { id: 'odile', name: 'Odile' })).toEqual(back)
    expect(stamp({ type: 'group', operations: [add(), back] as never })).toBeTruthy()
  })

  it('is refused to everybody else, in a group too, and for a reading nobody is known to have taken', () => {
    const notYours = { status: 403, code: 'not-your-reading' }
    expect(refusal(() => stamp(back, [add()]))).toMatchObject(notYours)
    expect(refusal(() => stamp({ type: 'group', operations: [back] as never }, [add()]))).toMatchObject(
      notYours,
    )
    expect(refusal(() => stamp(back))).toMatchObject(notYours)
  })

  it('stays who took it when somebody else brought the bay back by undo', () => {
    const history = [
      { operation: add(), personId: 'imre' },
      { operation: bayWith(reading()), personId: 'odile' },
    ]
    const known = new KnownReadings(history)
    expect(stampReadings(back, { person: imre, now, known })).toEqual(back)
  })
})
