import type { Bay } from '../schemas/bay'
import type { Post } from '../schemas/post'
import type { Run } from '../schemas/run'
import type { Corner, Survey } from '../schemas/survey'
import { baysNamed, byId, firstBays, postsOfBays, sideOfPost } from './run-posts'
import { baysByPost, type Stop, walk } from './walk'

export type GapCode =
  | 'no-posts'
  | 'post-alone'
  | 'material'
  | 'core'
  | 'cover'
  | 'size-along'
  | 'size-across'
  | 'no-run'
  | 'angle'
  | 'reading'

/** Something a survey still misses before its cut list can be worked out. */
export interface Gap {
  code: GapCode
  /** One post or one bay; neither while there is no post at all. */
  where: { post?: string; bay?: string }
  /** One sentence or two: what is missing and what to do. */
  text: string
}

/** What the gaps are found from, with names resolved. */
interface Known {
  posts: ReadonlyMap<string, Post>
  bays: ReadonlyMap<string, Bay>
  meeting: ReadonlyMap<string, Bay[]>
  runsOfBay: ReadonlyMap<string, Run[]>
  /** Sizes each post needs, and whether a run ends at it. */
  needs: ReadonlyMap<string, PostNeeds>
}

interface PostNeeds {
  isEnd: boolean
  sides: Set<'along' | 'across'>
}

/**
 * What a survey still misses, in walking order; what is missing at one place stands in the order it is best taken.
 *
 * A bay needs a reading that counts, unless its run has an overall one; a stair needs rise and going, or the gauge;
 * every bay belongs to a run. A post where a run ends needs its material and its size in the run's direction, a veneered
 * one its core and cover too; a wall of masonry is not sized. A post passed needs its size, unless the run was read overall.
 * Source: sections 1 to 6 of the calculation.
 */
export function findGaps(survey: Survey): Gap[] {
  if (survey.posts.length === 0) {
    return [
      {
        code: 'no-posts',
        where: {},
        text: 'There is no post yet. Put the first one on a photo or in the table.',
      },
    ]
  }
  const known = resolve(survey)
  return walk(survey).flatMap((stop) => gapsAt(known, stop))
}

/**
 * The next gap after one that was looked at, filled or not, in walking order; the first again after the last.
 * @returns undefined when nothing is missing
 */
export function nextGap(survey: Survey, after?: Gap): Gap | undefined {
  const gaps = findGaps(survey)
  if (!after) return gaps[0]
  const order = new Map(walk(survey).map((stop, i) => [placeOf(stop), i]))
  const rank = (gap: Gap): number =>
    (order.get(placeOf(gap.where)) ?? -1) * codes.length + codes.indexOf(gap.code)
  return gaps.find((gap) => rank(gap) > rank(after)) ?? gaps[0]
}

const codes: readonly GapCode[] = [
  'no-posts',
  'post-alone',
  'material',
  'core',
  'cover',
  'size-along',
  'size-across',
  'no-run',
  'angle',
  'reading',
]

const placeOf = (where: { post?: string; bay?: string } | Stop): string =>
  'post' in where ? `post ${where.post}` : 'bay' in where ? `bay ${where.bay}` : ''

function resolve(survey: Survey): Known {
  const runsOfBay = new Map<string, Run[]>()
  for (const run of survey.runs) {
    for (const id of run.bays) runsOfBay.set(id, [...(runsOfBay.get(id) ?? []), run])
  }
  const bays = byId(survey.bays)
  return {
    posts: byId(survey.posts),
    bays,
    meeting: baysByPost(survey),
    runsOfBay,
    needs: postNeeds(survey, bays),
  }
}

function postNeeds(survey: Survey, bays: ReadonlyMap<string, Bay>): ReadonlyMap<string, PostNeeds> {
  const needs = new Map<string, PostNeeds>()
  const first = firstBays(survey.bays)
  const corners = new Map<string, Corner>(survey.corners.map((corner) => [corner.post, corner]))
  const walls = new Set(survey.posts.flatMap(({ id, material }) => (material === 'masonry' ? [id] : [])))
  for (const run of survey.runs) {
    const posts = postsOfBays(baysNamed(bays, run.bays))
    posts.forEach((post, i) => {
      const isEnd = i === 0 || i === posts.length - 1
      if (!isEnd && hasReading(run)) return
      const known = needs.get(post) ?? { isEnd: false, sides: new Set() }
      const side = sideOfPost({ first: first.get(post), corner: corners.get(post) }, run.bays)
      if (!isEnd || !walls.has(post)) known.sides.add(side)
      needs.set(post, { ...known, isEnd: known.isEnd || isEnd })
    })
  }
  return needs
}

const rowEnd = ({ material }: Post): PostNeeds => ({
  isEnd: true,
  sides: new Set(material === 'masonry' ? [] : ['along' as const]),
})

const hasReading = ({ readings }: Bay | Run): boolean => readings.some(({ struck }) => struck === undefined)

function gapsAt(known: Known, stop: Stop): Gap[] {
  if ('bay' in stop) {
    const bay = known.bays.get(stop.bay)
    return bay ? bayGaps(bay, known.runsOfBay.get(bay.id) ?? []) : []
  }
  const post = known.posts.get(stop.post)
  if (!post) return []
  const where = { post: post.id }
  if (known.meeting.get(post.id)?.length === 0) {
    return [
      {
        code: 'post-alone',
        where,
        text: `Post ${post.id} has no bay. Join it to its neighbour, or remove it.`,
      },
    ]
  }
  const needs = known.needs.get(post.id)
  if (needs) return postGaps(post, needs)
  // Before there are runs: where a row stops, one will end.
  return known.meeting.get(post.id)?.length === 1 ? postGaps(post, rowEnd(post)) : []
}

function postGaps(post: Post, { isEnd, sides }: PostNeeds): Gap[] {
  const { id, material } = post
  const gaps: Gap[] = []
  const miss = (code: GapCode, text: string) => gaps.push({ code, where: { post: id }, text })
  if (isEnd && !material) miss('material', `Post ${id}: the material is missing. Choose what it is made of.`)
  if (isEnd && material === 'veneered') {
    if (!post.core)
      miss('core', `Post ${id} is veneered: what is under the veneer is missing. Choose its core.`)
    if (post.cover === undefined) {
      miss('cover', `Post ${id} is veneered: the thickness of its cover is missing. Measure it.`)
    }
  }
  for (const side of ['along', 'across'] as const) {
    if (!sides.has(side) || post[side] !== undefined) continue
    miss(`size-${side}`, `Post ${id}: its size ${side} is missing. Measure it, over its cover.`)
  }
  return gaps
}

function bayGaps(bay: Bay, runs: readonly Run[]): Gap[] {
  const { id } = bay
  const gaps: Gap[] = []
  const miss = (code: GapCode, text: string) => gaps.push({ code, where: { bay: id }, text })
  if (runs.length === 0) miss('no-run', `Bay ${id} is in no run, so it gets no cable. Put it into one.`)
  const isMeasured = (bay.rise !== undefined && bay.going !== undefined) || bay.gauge !== undefined
  if (bay.kind === 'stair' && !isMeasured) {
    miss('angle', `Stair ${id}: the angle is missing. Measure rise and going, or read the gauge.`)
  }
  const readOverall = runs.length > 0 && runs.every(hasReading)
  if (!hasReading(bay) && !readOverall) {
    miss('reading', `Bay ${id}: no reading. Tape it, best at the top and at the bottom.`)
  }
  return gaps
}
