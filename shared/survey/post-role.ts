import type { Survey } from '../schemas/survey'
import { cornerIsStraight } from './straight'
import { baysNamed, postsOfBays } from './run-posts'

export type PostRole = 'end' | 'corner' | 'through'

/** What the runs do at a post: which end there and which pass. */
export interface RunsAtPost {
  ends: string[]
  passes: string[]
}

export function runsAtPost(survey: Pick<Survey, 'bays' | 'runs'>, post: string): RunsAtPost {
  const at: RunsAtPost = { ends: [], passes: [] }
  for (const run of survey.runs) {
    const posts = postsOfBays(baysNamed(survey, run.bays))
    if (posts[0] === post || posts.at(-1) === post) at.ends.push(run.id)
    else if (posts.includes(post)) at.passes.push(run.id)
  }
  return at
}

/**
 * What a post is, by what the runs do there: *through* where cables only pass, *corner* where two or more runs end and do
 * not go straight on as far as is known, else *end*. A run divided at a post whose angle was measured as straight ends there twice.
 * @returns undefined where there is no run
 */
export function postRole(
  survey: Pick<Survey, 'bays' | 'runs' | 'corners'>,
  post: string,
): PostRole | undefined {
  const { ends, passes } = runsAtPost(survey, post)
  if (ends.length === 0) return passes.length > 0 ? 'through' : undefined
  const corner = survey.corners.find((known) => known.post === post)
  return ends.length > 1 && !(corner && cornerIsStraight(corner)) ? 'corner' : 'end'
}
