import type { Survey } from '../schemas/survey'
import { assertAllThere } from './lists'
import { bayRemovals } from './remove-bay'
import type { OperationOf, SimpleOperation } from './survey-operation'

/**
 * The group that removes posts with what hangs on them: their bays (and what that does to runs), diagonals, corner angles
 * and marks on photos.
 * @throws OperationRefused `not-there` when the survey has no such post.
 */
export function removePosts(survey: Survey, ids: readonly string[]): OperationOf<'group'> {
  assertAllThere(survey.posts, ids, 'post')
  const gone = new Set(ids)
  const meets = ({ from, to }: { from: string; to: string }) => gone.has(from) || gone.has(to)
  const idsOf = (list: readonly { id: string; from: string; to: string }[]) =>
    list.filter(meets).map(({ id }) => id)
  const marks = survey.photos.flatMap((photo) =>
    Object.keys(photo.posts).flatMap((post) => (gone.has(post) ? [{ photo: photo.id, post }] : [])),
  )
  return {
    type: 'group',
    operations: [
      ...bayRemovals(survey, idsOf(survey.bays)),
      ...idsOf(survey.diagonals).map((id): SimpleOperation => ({ type: 'diagonal.remove', id })),
      ...survey.corners
        .filter(({ post }) => gone.has(post))
        .map(({ post }): SimpleOperation => ({ type: 'corner.remove', post })),
      ...marks.map((mark): SimpleOperation => ({ type: 'photo.unmark', ...mark })),
      ...[...gone].map((id): SimpleOperation => ({ type: 'post.remove', id })),
    ],
  }
}
