import type { Bay } from '../schemas/bay'
import type { Survey } from '../schemas/survey'
import { otherPost } from './run-posts'

export type Stop = { post: string } | { bay: string }

/** The bays at each post, in the survey's order. */
export function baysByPost({ posts, bays }: Pick<Survey, 'posts' | 'bays'>): ReadonlyMap<string, Bay[]> {
  const meeting = new Map<string, Bay[]>(posts.map(({ id }) => [id, []]))
  for (const bay of bays) {
    meeting.get(bay.from)?.push(bay)
    meeting.get(bay.to)?.push(bay)
  }
  return meeting
}

/**
 * Every post and bay once, as one would walk by them: from an end of a row, post, bay, post; back to the last fork when a
 * row ends; then the next row.
 */
export function walk(survey: Pick<Survey, 'posts' | 'bays'>): Stop[] {
  const meeting = baysByPost(survey)
  const seen = new Set<string>()
  const stops: Stop[] = []
  const ends = survey.posts.filter(({ id }) => meeting.get(id)?.length === 1)
  for (const start of [...ends, ...survey.posts]) {
    if (seen.has(start.id)) continue
    const ahead: { post: string; by?: Bay }[] = [{ post: start.id }]
    for (let next = ahead.pop(); next; next = ahead.pop()) {
      if (next.by && !seen.has(`bay ${next.by.id}`)) {
        seen.add(`bay ${next.by.id}`)
        stops.push({ bay: next.by.id })
      }
      if (seen.has(next.post)) continue
      seen.add(next.post)
      stops.push({ post: next.post })
      const onward = (meeting.get(next.post) ?? []).filter(({ id }) => !seen.has(`bay ${id}`))
      for (const by of onward.toReversed()) ahead.push({ post: otherPost(by, next.post), by })
    }
  }
  return stops
}
