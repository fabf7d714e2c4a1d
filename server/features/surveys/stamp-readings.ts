import type { Reading } from '@shared/schemas/bay'
import type { ReadingOwner, SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'
import type { KnownReadings } from './known-readings'
import { notYourReading, readingChanged } from './surveys.errors'

export interface Stamp {
  person: { id: string; name: string }
  now: Date
  known: KnownReadings
}

/**
 * Writes who and when on every reading that a change adds. The sender is believed about the moment, where it is not in
 * the future, since a reading may be sent long after it was taken; never about the person. A reading that the history
 * holds comes back as it was or not at all, and only who took it may take it back.
 * @throws AppError `reading-changed`, `not-your-reading`
 */
export function stampReadings(operation: SurveyOperation, stamp: Stamp): SurveyOperation {
  if (operation.type !== 'group') return stampStep(operation, stamp)
  return { ...operation, operations: operation.operations.map((step) => stampStep(step, stamp)) }
}

function stampStep(step: SimpleOperation, stamp: Stamp): SimpleOperation {
  if (step.type === 'reading.retract') assertOwn(step, stamp)
  const stamped = stampOne(step, stamp)
  stamp.known.note(stamped, stamp.person.id)
  return stamped
}

function stampOne(operation: SimpleOperation, stamp: Stamp): SimpleOperation {
  if (operation.type === 'reading.add') {
    return { ...operation, reading: stampReading(operation.of, operation.reading, stamp) }
  }
  if (operation.type === 'bay.add') {
    const owner: ReadingOwner = { kind: 'bay', id: operation.bay.id }
    const readings = operation.bay.readings.map((reading) => stampReading(owner, reading, stamp))
    return { ...operation, bay: { ...operation.bay, readings } }
  }
  if (operation.type === 'run.add') {
    const owner: ReadingOwner = { kind: 'run', id: operation.run.id }
    const readings = operation.run.readings.map((reading) => stampReading(owner, reading, stamp))
    return { ...operation, run: { ...operation.run, readings } }
  }
  return operation
}

function stampReading(owner: ReadingOwner, reading: Reading, { person, now, known }: Stamp): Reading {
  const before = known.find(owner, reading.id)?.reading
  if (before) {
    if (before.at !== reading.at || before.value !== reading.value) throw readingChanged(owner, reading.id)
    // Struck or not as it is now: striking came later, and is no part of what was read.
    const { struck: _struck, ...asTaken } = before
    return reading.struck === undefined ? asTaken : { ...asTaken, struck: reading.struck }
  }
  const said = reading.on === undefined ? undefined : new Date(reading.on)
  const on = said && said <= now ? said : now
  return { ...reading, by: person.name, on: on.toISOString() }
}

/** Undo of a reading just taken, in the same hand; everybody else strikes it with a reason. */
function assertOwn(
  { of, id }: Extract<SimpleOperation, { type: 'reading.retract' }>,
  { person, known }: Stamp,
): void {
  if (known.find(of, id)?.personId !== person.id) throw notYourReading(of)
}
