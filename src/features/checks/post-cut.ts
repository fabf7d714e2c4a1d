import type { PostCheck } from '@shared/calculation/checks/check-post'
import type { Post } from '@shared/schemas/post'
import type { PostCut } from './section-shape'

/**
 * A post as it is cut for drawing, its size in the run's direction first; nm.
 *
 * @returns undefined while a size that the drawing needs was not taken
 */
export function postCut({ section, backLeft, fitting }: PostCheck, post: Post): PostCut | undefined {
  const cover = post.cover ?? 0
  if (section) return { along: section.along + 2 * cover, across: section.across + 2 * cover, cover }
  const { along, across } = post
  if (along === undefined || across === undefined) return undefined
  // Which of its sizes lies in the run's direction shows in what the body leaves behind it.
  const depth = backLeft === undefined ? along : backLeft + (fitting?.body ?? 0)
  const isTurned = Math.abs(depth - across) < 1 && Math.abs(depth - along) >= 1
  return isTurned ? { along: across, across: along, cover } : { along, across, cover }
}
