import type { Run } from '../schemas/run'
import type { Survey } from '../schemas/survey'
import { nextId } from './next-id'
import type { SimpleOperation } from './survey-operation'

/**
 * Operations that leave a run with the first of these parts and give each other part a run of its own with the same
 * cable and settings, next in the list; without parts the run goes. An overall reading no longer measures the run once its ends
 * have moved, so it is struck, and the reason given.
 *
 * @param taken ids of runs in use; those made here are added to it
 */
export function divideRun(
  { runs }: Pick<Survey, 'runs'>,
  { run, parts }: { run: Run; parts: readonly (readonly string[])[] },
  taken: Set<string>,
): SimpleOperation[] {
  const [first, ...others] = parts
  if (!first) return [{ type: 'run.remove', id: run.id }]
  const index = runs.findIndex(({ id }) => id === run.id)
  return [
    ...strikeOverall(run, 'the run ends elsewhere now'),
    { type: 'run.set', id: run.id, set: { bays: [...first] }, unset: [] },
    ...others.map((bays, i): SimpleOperation => {
      const id = nextId(taken, 'R')
      taken.add(id)
      return { type: 'run.add', run: { ...run, id, bays: [...bays], readings: [] }, index: index + 1 + i }
    }),
  ]
}

const strikeOverall = ({ id, readings }: Run, reason: string): SimpleOperation[] =>
  readings
    .filter(({ struck }) => struck === undefined)
    .map((reading) => ({ type: 'reading.strike', of: { kind: 'run', id }, id: reading.id, reason }))
