import type { Post } from '../schemas/post'
import type { Length } from '../units/length'
import { toRadians } from '../units/angle'
import type { SurveyIndex } from './survey-index'

export interface PostSize {
  post: Post
  /** The post's size in the run's direction, outside the cover, nm; undefined when it was not measured. */
  size?: Length
  /** Which of its two sizes that is. */
  side: 'along' | 'across'
  /** No corner angle was taken, and the corner was assumed square. */
  assumed: boolean
}

/** sin 45°: a corner is turned when its angle is nearer 90° than straight. */
const NEARER_SQUARE = 0.7071

/**
 * The size of a post in the direction of a run.
 *
 * Formula: `along` is parallel to the first bay of the survey that names the post. A run that holds this bay, or
 * passes straight on from it, takes `along`; a run that meets the post the other way takes `across`. The corner
 * angle decides which (nearer 90° is the other way); without one a corner is square.
 * Units: nm.
 * Source: section 3 of the calculation; section 12 for the corner assumed square.
 *
 * @example P3, 5 in along B2 of R1 and 3.5 in across: R2, which leaves P3 at 90°, takes 3.5 in
 */
export function postSize(
  { firstBay, corners }: Pick<SurveyIndex, 'firstBay' | 'corners'>,
  post: Post,
  runBays: readonly string[],
): PostSize {
  const first = firstBay.get(post.id)
  if (!first || runBays.includes(first.id)) return { post, size: post.along, side: 'along', assumed: false }
  const corner = corners.get(post.id)
  const turned = corner === undefined || Math.abs(Math.sin(toRadians(corner))) > NEARER_SQUARE
  const side = turned ? 'across' : 'along'
  return { post, size: post[side], side, assumed: corner === undefined }
}
