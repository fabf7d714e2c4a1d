import type { Radians } from '../units/angle'
import type { PostSize } from './post-size'

/** A post passed by a cable; nm, unrounded. */
export interface PostPath {
  kind: 'post'
  post: PostSize
  size: number
  factor: number
  value: number
  readingLimit: number
}

/**
 * The length of cable inside a post that it passes, and its limit.
 *
 * Formula: `size · (½ / cos θ before + ½ / cos θ after)`, and one reading limit times the same factor.
 * Units: nm; angles in radians.
 * Source: section 3 of the calculation.
 *
 * @returns undefined when the post's size was not measured
 * @example 3.5 in between a level bay and a stair with cos θ 0.8: 3.5 · (0.5 + 0.625) = 3.9375 in
 */
export function postPath(
  post: PostSize,
  { before, after }: { before: Radians; after: Radians },
  readingLimit: number,
): PostPath | undefined {
  if (post.size === undefined) return undefined
  const factor = 0.5 / Math.cos(before) + 0.5 / Math.cos(after)
  return {
    kind: 'post',
    post,
    size: post.size,
    factor,
    value: post.size * factor,
    readingLimit: readingLimit * factor,
  }
}
