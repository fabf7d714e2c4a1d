import type { Reading } from '@shared/schemas/bay'
import type { ReadingOwner, SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'

/** The readings that a survey's history has seen, each with who and when as they were stamped then. */
export function knownReadings(
  operations: Iterable<SurveyOperation>,
): (owner: ReadingOwner, reading: Reading) => boolean {
  const seen = new Set<string>()
  const note = (owner: ReadingOwner, readings: readonly Reading[]) =>
    readings.forEach((reading) => seen.add(name(owner, reading)))
  const look = (operation: SimpleOperation) => {
    if (operation.type === 'reading.add') note(operation.of, [operation.reading])
    if (operation.type === 'bay.add') note({ kind: 'bay', id: operation.bay.id }, operation.bay.readings)
    if (operation.type === 'run.add') note({ kind: 'run', id: operation.run.id }, operation.run.readings)
  }
  for (const operation of operations) {
    if (operation.type === 'group') operation.operations.forEach(look)
    else look(operation)
  }
  return (owner, reading) => seen.has(name(owner, reading))
}

/** All that makes a reading itself. Striking comes later and does not belong to it. */
const name = (owner: ReadingOwner, { id, at, value, by, on }: Reading): string =>
  JSON.stringify([owner.kind, owner.id, id, at, value, by ?? null, on ?? null])
