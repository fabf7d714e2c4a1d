import type { Bay } from '../schemas/bay'
import type { Corner } from '../schemas/survey'
import { toRadians } from '../units/angle'

/** The other end of a bay. */
export const otherPost = ({ from, to }: Pick<Bay, 'from' | 'to'>, post: string): string =>
  post === from ? to : from

/**
 * The posts a run goes by, one more than its bays: end, those passed, end. Bays may be written in either direction; a
 * single bay runs as it is written.
 */
export function postsOfBays(bays: readonly Pick<Bay, 'from' | 'to'>[]): string[] {
  const [first, second] = bays
  if (!first) return []
  const meets = !second || second.from === first.to || second.to === first.to
  const posts = [meets ? first.from : first.to]
  for (const bay of bays) posts.push(otherPost(bay, posts.at(-1) ?? bay.from))
  return posts
}

/** Things by their ids. */
export const byId = <Item extends { id: string }>(items: readonly Item[]): ReadonlyMap<string, Item> =>
  new Map(items.map((item) => [item.id, item]))

/** The bays these ids name, in that order. */
export const baysNamed = (bays: ReadonlyMap<string, Bay>, ids: readonly string[]): Bay[] =>
  ids.flatMap((id) => bays.get(id) ?? [])

/** The first bay, in the survey's order, that names each post: its size `along` is parallel to it. */
export function firstBays(bays: readonly Bay[]): ReadonlyMap<string, string> {
  const first = new Map<string, string>()
  for (const bay of bays) {
    for (const post of [bay.from, bay.to]) if (!first.has(post)) first.set(post, bay.id)
  }
  return first
}

/** sin 45°: a corner is turned when its angle is nearer 90° than straight. */
const NEARER_SQUARE = 0.7071

/**
 * Which size of a post lies in the direction of a run: `along` where the run holds the first bay that names the post or
 * goes straight on from it, else `across`; a corner without an angle is square (sections 3 and 12 of the calculation).
 */
export function sideOfPost(
  { first, corner }: { first: string | undefined; corner: Corner | undefined },
  runBays: readonly string[],
): 'along' | 'across' {
  if (first === undefined || runBays.includes(first)) return 'along'
  return !corner || Math.abs(Math.sin(toRadians(corner.angle))) > NEARER_SQUARE ? 'across' : 'along'
}
