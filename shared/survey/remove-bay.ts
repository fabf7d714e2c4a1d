import type { Survey } from '../schemas/survey'
import { divideRun } from './divide-run'
import { assertAllThere } from './lists'
import type { OperationOf, SimpleOperation } from './survey-operation'

/**
 * The group that removes bays with what hangs on them: a run loses the bay, is divided where it stood in the middle, and
 * goes with its last bay.
 * @throws OperationRefused `not-there` when the survey has no such bay.
 */
export const removeBays = (survey: Survey, ids: readonly string[]): OperationOf<'group'> => ({
  type: 'group',
  operations: bayRemovals(survey, ids),
})

/** The steps of `removeBays`, for a larger group. @throws OperationRefused `not-there` */
export function bayRemovals(survey: Survey, ids: readonly string[]): SimpleOperation[] {
  assertAllThere(survey.bays, ids, 'bay')
  const gone = new Set(ids)
  const taken = new Set(survey.runs.map(({ id }) => id))
  return [
    ...survey.runs
      .filter(({ bays }) => bays.some((bay) => gone.has(bay)))
      .flatMap((run) => divideRun(survey, { run, parts: partsWithout(run.bays, gone) }, taken)),
    ...[...gone].map((id): SimpleOperation => ({ type: 'bay.remove', id })),
  ]
}

/** What is left of a run's bays, in unbroken parts. */
function partsWithout(bays: readonly string[], gone: ReadonlySet<string>): string[][] {
  const parts: string[][] = []
  let part: string[] = []
  for (const bay of bays) {
    if (gone.has(bay)) part = []
    else {
      if (part.length === 0) parts.push(part)
      part.push(bay)
    }
  }
  return parts
}
