import type { Reading } from '@shared/schemas/bay'
import type { ReadingOwner, SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'

export interface Stamp {
  /** Name of the person who sends the change. */
  by: string
  now: Date
  /** Whether the survey's history holds this very reading: then it comes back as it was, by undo. */
  isKnown: (owner: ReadingOwner, reading: Reading) => boolean
}

/**
 * Writes who and when on every reading that a change adds. The sender is believed about the moment, where it is not in
 * the future, since a reading may be sent long after it was taken; never about the person.
 */
export function stampReadings(operation: SurveyOperation, stamp: Stamp): SurveyOperation {
  if (operation.type !== 'group') return stampOne(operation, stamp)
  return { ...operation, operations: operation.operations.map((one) => stampOne(one, stamp)) }
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

function stampReading(owner: ReadingOwner, reading: Reading, { by, now, isKnown }: Stamp): Reading {
  if (isKnown(owner, reading)) return reading
  const said = reading.on === undefined ? undefined : new Date(reading.on)
  const on = said && said <= now ? said : now
  return { ...reading, by, on: on.toISOString() }
}

/** Whether a change brings a reading under another person’s name, so that the history must be asked whether it is theirs. */
export const namesAnother = (operation: SurveyOperation, by: string): boolean =>
  (operation.type === 'group' ? operation.operations : [operation])
    .flatMap(carried)
    .some((reading) => reading.by !== undefined && reading.by !== by)

const carried = (operation: SimpleOperation): Reading[] => {
  if (operation.type === 'reading.add') return [operation.reading]
  if (operation.type === 'bay.add') return operation.bay.readings
  return operation.type === 'run.add' ? operation.run.readings : []
}
