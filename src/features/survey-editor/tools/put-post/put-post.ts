import { nextId } from '@shared/survey/next-id'
import { photoOf, type Stroke, unplacedPosts } from '../../model/marks'
import type { ToolHost } from '../tool'

/** Marks the post being placed on this photo, or a new post; one change either way. A stroke drawn downward is turned. */
export function putPost(host: ToolHost, drawn: Stroke): void {
  const { survey, photoId, placing } = host.state
  if (photoId === null) return
  const mark = drawn.top[1] <= drawn.base[1] ? drawn : { base: drawn.top, top: drawn.base }
  const post =
    placing ??
    nextId(
      survey.posts.map(({ id }) => id),
      'P',
    )
  const place = { type: 'photo.mark', photo: photoId, post, mark } as const
  host.perform(
    placing ? place : { type: 'group', operations: [{ type: 'post.add', post: { id: post } }, place] },
  )
  if (placing)
    host.setPlacing(unplacedPosts(host.state.survey, photoOf(host.state.survey, photoId))[0] ?? null)
  host.select({ kind: 'post', id: post })
}
