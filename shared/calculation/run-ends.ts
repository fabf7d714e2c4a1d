import type { Fitting } from '../schemas/hardware'
import type { Degrees } from '../units/angle'
import { angleAtFitting } from './angle-at-fitting'
import { byPreference, chooseFitting, type FittingChoice } from './choose-fitting'
import type { Course, Leg } from './course'
import type { PostSize } from './post-size'
import type { SurveyIndex } from './survey-index'

/** One end of a run: its post, the angle the cable leaves it at and the fittings weighed for it. */
export interface RunEnd {
  post: PostSize
  /** Undefined while the stair's angle is unknown; then there is no choice either. */
  angle?: Degrees
  choice?: FittingChoice
}

export interface RunEnds {
  from: RunEnd
  to: RunEnd
}

/** Chooses the fittings of both ends of a run. @returns undefined for a run without bays */
export function runEnds(index: SurveyIndex, course: Course): RunEnds | undefined {
  const [firstLeg, lastLeg] = [course.legs[0], course.legs.at(-1)]
  const [firstPost, lastPost] = [course.posts[0], course.posts.at(-1)]
  if (!firstLeg || !lastLeg || !firstPost || !lastPost) return undefined
  return {
    from: runEnd(index, course, { post: firstPost, leg: firstLeg, skew: firstLeg.skewIn }),
    to: runEnd(index, course, { post: lastPost, leg: lastLeg, skew: lastLeg.skewOut }),
  }
}

function runEnd(
  { hardware, rules }: SurveyIndex,
  { cable }: Course,
  { post, leg, skew }: { post: PostSize; leg: Leg; skew: Degrees },
): RunEnd {
  if (!leg.angle || !cable) return { post }
  const angle = angleAtFitting(leg.angle.angle, skew)
  const stock = { cable: cable.id, fittings: hardware.fittings, backWall: rules.backWall }
  return { post, angle, choice: chooseFitting({ post: post.post, size: post.size, angle }, stock) }
}

/** The fitting of an end, where one suits and no missing size could change the choice. */
export function settledFitting(end: RunEnd): Fitting | undefined {
  return needsSize(end) ? undefined : end.choice?.chosen
}

/** Whether the choice waits for the post's size: a drilled fitting that may be the better one depends on it. */
export function needsSize({ choice }: RunEnd): boolean {
  if (!choice) return false
  const { chosen, passedOver } = choice
  return passedOver.some(
    ({ fitting, reason }) =>
      reason.because === 'size-missing' && (!chosen || byPreference(fitting, chosen) < 0),
  )
}
