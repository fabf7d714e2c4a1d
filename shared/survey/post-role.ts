import type { Survey } from '../schemas/survey'
import { baysNamed, byId, postsOfBays } from './run-posts'
import { cornerIsStraight } from './straight'

export type PostRole = 'end' | 'corner' | 'through'
type Known = Pick<Survey, 'bays' | 'runs' | 'corners'>

/** What the runs do at a post: which end there and which pass, by id. */
export interface RunsAtPost {
  ends: string[]
  passes: string[]
}

/** The runs at every post that has any. */
export function runsAtPosts({ bays, runs }: Pick<Known, 'bays' | 'runs'>): ReadonlyMap<string, RunsAtPost> {
  const known = byId(bays)
  const found = new Map<string, RunsAtPost>()
  for (const run of runs) {
    const posts = postsOfBays(baysNamed(known, run.bays))
    const ends = new Set([posts[0], posts.at(-1)])
    for (const post of new Set(posts)) {
      const at = found.get(post) ?? { ends: [], passes: [] }
      at[ends.has(post) ? 'ends' : 'passes'].push(run.id)
      found.set(post, at)
    }
  }
  return found
}

/**
 * What each post is, by what the runs do there: *through* where cables only pass, *corner* where two or more runs end and do
 * not go straight on as far as is known, else *end*. A run divided at a post whose angle was measured as straight ends
 * there twice. A post without a run has no role.
 */
export function postRoles(survey: Known): ReadonlyMap<string, PostRole> {
  const straight = new Set(survey.corners.filter(cornerIsStraight).map(({ post }) => post))
  const roles = new Map<string, PostRole>()
  for (const [post, { ends }] of runsAtPosts(survey)) {
    const turns = ends.length > 1 && !straight.has(post)
    roles.set(post, ends.length === 0 ? 'through' : turns ? 'corner' : 'end')
  }
  return roles
}

/** What one post is; see `postRoles`. @returns undefined where there is no run */
export const postRole = (survey: Known, post: string): PostRole | undefined => postRoles(survey).get(post)
