import type { Survey } from '@shared/schemas/survey'
import type { SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'

/** Most operations that one group holds. */
const GROUP = 2000

/**
 * The operations that make this survey out of an empty one, so that an imported survey has a history like any other.
 * Photos are no part of it.
 */
export function surveyAsOperations({
  title,
  units,
  guard,
  posts,
  bays,
  runs,
  corners,
  diagonals,
}: Survey): SurveyOperation[] {
  const operations: SimpleOperation[] = [
    { type: 'survey.set', set: { title, units }, unset: [] },
    { type: 'guard.set', set: guard, unset: [] },
    ...posts.map((post) => ({ type: 'post.add' as const, post })),
    ...bays.map((bay) => ({ type: 'bay.add' as const, bay })),
    ...runs.map((run) => ({ type: 'run.add' as const, run })),
    ...corners.map((corner) => ({ type: 'corner.set' as const, corner })),
    ...diagonals.map((diagonal) => ({ type: 'diagonal.add' as const, diagonal })),
  ]
  const groups: SurveyOperation[] = []
  for (let at = 0; at < operations.length; at += GROUP) {
    groups.push({ type: 'group', operations: operations.slice(at, at + GROUP) })
  }
  return groups
}
