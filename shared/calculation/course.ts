import type { Bay } from '../schemas/bay'
import type { Cable } from '../schemas/hardware'
import type { Run } from '../schemas/run'
import type { Degrees } from '../units/angle'
import { type GapReadings, gapReadings } from './clear-length'
import { type PostSize, postSize } from './post-size'
import { type BayAngle, stairAngle } from './stair-angle'
import type { SurveyIndex } from './survey-index'

/** One bay of a run, in the run's direction. */
export interface Leg {
  bay: Bay
  readings: GapReadings
  /** Undefined for a stair of unknown angle. */
  angle?: BayAngle
  skewIn: Degrees
  skewOut: Degrees
}

/** A run laid out: its bays in order with what was read of them, and the posts at and between their ends. */
export interface Course {
  run: Run
  /** Undefined when the catalogue has no such cable. */
  cable?: Cable
  legs: Leg[]
  /** One more than there are legs: end, those passed, end. */
  posts: PostSize[]
  /** The overall readings. */
  overall: GapReadings
  /** Newtons. */
  tension: number
}

/** Lays a run out in its own direction. @returns undefined when a bay or post it names is not in the survey. */
export function layOutRun(index: SurveyIndex, run: Run): Course | undefined {
  const bays: Bay[] = []
  for (const id of run.bays) {
    const bay = index.bays.get(id)
    if (!bay) return undefined
    bays.push(bay)
  }
  const names = postsInOrder(bays)
  const posts: PostSize[] = []
  for (const name of names) {
    const post = index.posts.get(name)
    if (!post) return undefined
    posts.push(postSize(index, post, run.bays))
  }
  return {
    run,
    cable: index.cables.get(run.cable),
    legs: bays.map((bay, i) => layOutBay(index, bay, bay.from !== names[i])),
    posts,
    overall: gapReadings(run.readings),
    tension: run.tension ?? index.rules.tension,
  }
}

/** The posts a run goes by. Bays may be written in either direction; a single bay runs as it is written. */
function postsInOrder(bays: readonly Bay[]): string[] {
  const [first, second] = bays
  if (!first) return []
  const meets = (post: string) => !second || second.from === post || second.to === post
  const names = meets(first.to) ? [first.from] : [first.to]
  for (const bay of bays) names.push(bay.from === names.at(-1) ? bay.to : bay.from)
  return names
}

function layOutBay(index: SurveyIndex, bay: Bay, backwards: boolean): Leg {
  return {
    bay,
    readings: gapReadings(bay.readings),
    angle: stairAngle(bay, index.rules),
    skewIn: backwards ? bay.skewTo : bay.skewFrom,
    skewOut: backwards ? bay.skewFrom : bay.skewTo,
  }
}
