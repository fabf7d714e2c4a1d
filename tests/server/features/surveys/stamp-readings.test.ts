import { describe, expect, it } from 'vitest'
import type { Reading } from '@shared/schemas/bay'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { inches } from '@shared/units/length'
import { knownReadings } from '../../../../server/features/surveys/known-readings'
import { namesAnother, stampReadings } from '../../../../server/features/surveys/stamp-readings'

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

const stamp = (operation: SurveyOperation, history: SurveyOperation[] = []) =>
  stampReadings(operation, { by: 'Imre', now, isKnown: knownReadings(history) })
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
      operations: [add({ by: 'Odile' }), bayWith(reading({ by: 'Odile' })), run] as never,
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

  it.each([
    ['another figure', { value: inches(64.5) }],
    ['another place', { at: 'bottom' as const }],
    ['another moment', { on: '2026-05-02T08:00:00.000Z' }],
  ])('is the sender’s with %s', (_what, more) => {
    const again = stamp(bayWith({ ...theirs, ...more }), [add(theirs)])
    expect(JSON.stringify(again)).toContain('"by":"Imre"')
  })
})

describe('namesAnother', () => {
  it('is true only for a reading under another name', () => {
    expect(namesAnother(add(), 'Imre')).toBe(false)
    expect(namesAnother(add({ by: 'Imre' }), 'Imre')).toBe(false)
    expect(namesAnother(add({ by: 'Odile' }), 'Imre')).toBe(true)
    expect(namesAnother(bayWith(reading({ by: 'Odile' })), 'Imre')).toBe(true)
    expect(namesAnother({ type: 'post.remove', id: 'P1' }, 'Imre')).toBe(false)
  })
})
