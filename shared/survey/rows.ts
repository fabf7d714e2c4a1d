import type { Bay, Reading } from '../schemas/bay'
import type { Post } from '../schemas/post'
import type { Run } from '../schemas/run'
import type { Corner, Survey } from '../schemas/survey'
import { toDegrees, toRadians } from '../units/angle'
import { byId, otherPost, postsOfBays } from './run-posts'
import { splitEvenly } from './split-evenly'
import { cornerIsStraight } from './straight'
import { baysByPost } from './walk'

/** What runs are proposed by. */
export interface RowRules {
  /** nm; no limit when undefined. */
  longestRun?: number
  /** Degrees. */
  maxBend: number
}

/** A survey with its names resolved, and what may be one run in it. */
export interface Rows extends RowRules {
  bays: ReadonlyMap<string, Bay>
  posts: ReadonlyMap<string, Post>
  corners: ReadonlyMap<string, Corner>
  meeting: ReadonlyMap<string, Bay[]>
}

export const resolveRows = (survey: Survey, rules: RowRules): Rows => ({
  ...rules,
  bays: byId(survey.bays),
  posts: byId(survey.posts),
  corners: new Map(survey.corners.map((corner) => [corner.post, corner])),
  meeting: baysByPost(survey),
})

const ANGLE_NOISE = 1e-9

/** The pitch of a bay in degrees, as section 2 of the calculation takes it; undefined where it was not measured. */
function pitch({ kind, rise, going, gauge }: Bay): number | undefined {
  if (kind === 'level') return 0
  return rise !== undefined && going !== undefined ? toDegrees(Math.atan2(rise, going)) : gauge
}

/**
 * Whether a cable can go on from one bay into the next at the post between them: no corner is known there, and the pitch
 * stays. A post whose corner angle was not taken counts as straight; a stair not measured yet as pitched like its neighbour.
 */
export function goesOn(rows: Rows, post: string, [a, b]: readonly [Bay, Bay]): boolean {
  const corner = rows.corners.get(post)
  if (corner && !cornerIsStraight(corner)) return false
  if (a.kind !== b.kind || otherPost(a, post) === otherPost(b, post)) return false
  const [before, after] = [pitch(a), pitch(b)]
  return before === undefined || after === undefined || Math.abs(before - after) <= rows.maxBend + ANGLE_NOISE
}

/** The bays cut into parts that can each be one run: at corners and changes of pitch, then evenly where it is too long. */
export function runParts(rows: Rows, bays: readonly Bay[], overall: readonly Reading[] = []): Bay[][] {
  const posts = postsOfBays(bays)
  // What comes back to a post cannot be straight all the way: there, only posts measured as straight are passed.
  const comesBack = new Set(posts).size < posts.length
  const straightOn = cutWhere(bays, (a, b, i) => {
    const post = posts[i] ?? ''
    return !goesOn(rows, post, [a, b]) || (comesBack && !rows.corners.has(post))
  })
  if (straightOn.length > 1) return straightOn.flatMap((part) => runParts(rows, part))
  return comesBack ? bays.map((bay) => [bay]) : evenParts(rows, bays, greatest(overall))
}

/** `cuts` is asked of each two neighbours, with the place of the later one. */
function cutWhere(bays: readonly Bay[], cuts: (a: Bay, b: Bay, i: number) => boolean): Bay[][] {
  const parts: Bay[][] = []
  bays.forEach((bay, i) => {
    const [before, part] = [bays[i - 1], parts.at(-1)]
    if (!before || !part || cuts(before, bay, i)) parts.push([bay])
    else part.push(bay)
  })
  return parts
}

function evenParts(rows: Rows, bays: readonly Bay[], overall: number | undefined): Bay[][] {
  const passed = postsOfBays(bays).slice(1, -1)
  const posts = passed.map((id) => rows.posts.get(id)?.along ?? rows.posts.get(id)?.across ?? 0)
  const lengths = bays.map(lengthAlong)
  const known = [...lengths, ...posts].reduce<number>((sum, length) => sum + (length ?? 0), 0)
  const unread = lengths.filter((length) => length === undefined).length
  // What the overall reading leaves is shared among the bays not read; without one they have no length yet.
  const share = overall === undefined || unread === 0 ? 0 : Math.max(0, overall - known) / unread
  let at = 0
  const sizes = splitEvenly({ bays: lengths.map((length) => length ?? share), posts }, rows.longestRun)
  return sizes.map((size) => bays.slice(at, (at += size)))
}

/** A bay along the cable, nm; undefined where nothing was read. The greater of top and bottom, since a limit is at stake. */
function lengthAlong(bay: Bay): number | undefined {
  const clear = greatest(bay.readings)
  const isTapedLevel = bay.kind === 'stair' && bay.taped === 'level'
  return clear && (isTapedLevel ? clear / Math.cos(toRadians(pitch(bay) ?? 0)) : clear)
}

/** The greater of the means at the top and at the bottom, struck readings left out. */
function greatest(readings: readonly Reading[]): number | undefined {
  const means = (['top', 'bottom'] as const).flatMap((place) => {
    const values = readings.filter(({ at, struck }) => at === place && struck === undefined)
    return values.length > 0 ? values.reduce((sum, { value }) => sum + value, 0) / values.length : []
  })
  return means.length > 0 ? Math.max(...means) : undefined
}

/** Whether a run was read end to end, so that its ends may not move without striking that. */
export const isReadOverall = ({ readings }: Run): boolean =>
  readings.some(({ struck }) => struck === undefined)
