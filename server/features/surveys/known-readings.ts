import type { Reading } from '@shared/schemas/bay'
import type { ReadingOwner, SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'

/** A reading as it was first added, and by whom. */
export interface KnownReading {
  reading: Reading
  personId: string
}

/** One change as the history keeps it. */
export interface HistoricChange {
  operation: SurveyOperation
  personId: string
}

/** The readings a survey's history has seen, so that one that comes back is the same one and stays its taker's. */
export class KnownReadings {
  private readonly first = new Map<string, KnownReading>()

  constructor(history: Iterable<HistoricChange> = []) {
    for (const { operation, personId } of history) {
      for (const step of stepsOf(operation)) this.note(step, personId)
    }
  }

  find(owner: ReadingOwner, id: string): KnownReading | undefined {
    return this.first.get(keyOf(owner, id))
  }

  /** Remembers the readings a step brings, where they are new. */
  note(step: SimpleOperation, personId: string): void {
    for (const { owner, reading } of carriedBy(step)) {
      const key = keyOf(owner, reading.id)
      if (!this.first.has(key)) this.first.set(key, { reading, personId })
    }
  }
}

const keyOf = ({ kind, id: owner }: ReadingOwner, id: string): string => JSON.stringify([kind, owner, id])

export const stepsOf = (operation: SurveyOperation): SimpleOperation[] =>
  operation.type === 'group' ? operation.operations : [operation]

/** The readings a step brings into the survey. */
export function carriedBy(step: SimpleOperation): { owner: ReadingOwner; reading: Reading }[] {
  if (step.type === 'reading.add') return [{ owner: step.of, reading: step.reading }]
  if (step.type === 'bay.add') return belonging({ kind: 'bay', id: step.bay.id }, step.bay.readings)
  if (step.type === 'run.add') return belonging({ kind: 'run', id: step.run.id }, step.run.readings)
  return []
}

const belonging = (owner: ReadingOwner, readings: readonly Reading[]) =>
  readings.map((reading) => ({ owner, reading }))

/** The ids of the readings a change brings or takes back: those the history must be asked about. */
export const readingIdsIn = (operation: SurveyOperation): string[] =>
  stepsOf(operation).flatMap((step) =>
    step.type === 'reading.retract' ? [step.id] : carriedBy(step).map(({ reading }) => reading.id),
  )
