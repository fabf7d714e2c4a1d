import { toDegrees } from '../units/angle'
import { type CableHeights, cableHeights } from './cable-heights'
import { type CablePath, cablePath, type PathContext } from './cable-path'
import { strainAtTension } from './cable-properties'
import type { Course } from './course'
import { type CutLength, cutLength, type CutProblem } from './cut-length'
import { cutDepth } from './cut-point'
import { groupCuts } from './group-cuts'
import { guardOpening, type Opening } from './guard-opening'
import { type Missing, missingReadings } from './missing-readings'
import type { WhyNone } from './result'
import { type RunEnds, runEnds, settledFitting } from './run-ends'
import { slop } from './stack-limits'
import type { SurveyIndex } from './survey-index'

/** Everything worked out about one cable, before it is told as a result, a finding or a working. */
export interface CableFigures {
  /** From 1, the lowest. */
  number: number
  height: number
  path?: CablePath
  problem?: CutProblem
  /** As cut on its own. */
  own?: CutLength
  /** As it is to be cut: its own, or the run's one length. */
  cut?: CutLength
  why?: WhyNone
  /** A clear length of zero or less, or no room between the fittings: readings that cannot be right. */
  impossible?: 'readings' | 'room'
}

/** Everything worked out about one run. */
export interface RunFigures {
  course: Course
  opening: Opening
  heights: CableHeights
  ends: RunEnds
  missing: Missing[]
  cables: CableFigures[]
}

/** Works a run out, cable by cable. @returns undefined for a run without bays */
export function figureRun(index: SurveyIndex, course: Course): RunFigures | undefined {
  const ends = runEnds(index, course)
  if (!ends) return undefined
  const opening = guardOpening(
    index.survey.guard,
    course.legs.every(({ bay }) => bay.kind === 'stair'),
  )
  const flattest = flattestAngle(course)
  const { holeStep } = index.rules
  const heights = cableHeights(course.run.cables, opening, { flattest, holeStep })
  const missing = missingReadings(course, ends)
  const context = { readAt: index.survey.guard.readAt, rules: index.rules }
  const figure = (height: number, i: number) => figureCable({ course, ends, missing, context }, height, i + 1)
  const cables = heights.heights.map(figure)
  return { course, opening, heights, ends, missing, cables: group(cables, index) }
}

/** θmin: the flattest bay sets the pitch. A stair of unknown angle is left out of it. */
function flattestAngle({ legs }: Course): number {
  const known = legs.flatMap(({ angle }) => (angle ? [angle.angle] : []))
  return known.length > 0 ? Math.min(...known) : 0
}

interface CableContext {
  course: Course
  ends: RunEnds
  missing: Missing[]
  context: PathContext
}

function figureCable(
  { course, ends, missing, context }: CableContext,
  height: number,
  number: number,
): CableFigures {
  const path = cablePath(course, height, context)
  if (missing.length > 0) return { number, height, path, why: 'missing-reading' }
  if (!path || path.terms.some((term) => (term.kind === 'bay' ? term.clear : term.value) <= 0)) {
    return { number, height, why: 'missing-reading', impossible: 'readings' }
  }
  const problem = cutProblem(course, ends, { path, rules: context.rules })
  if (!problem) return { number, height, path, why: 'no-fitting' }
  if (problem.path + problem.depths <= 0)
    return { number, height, path, why: 'no-fitting', impossible: 'room' }
  const own = cutLength(problem, context.rules)
  return { number, height, path, problem, own, why: own.mode === 'none' ? 'too-long' : undefined }
}

function cutProblem(
  { cable, tension }: Course,
  ends: RunEnds,
  { path, rules }: { path: CablePath; rules: PathContext['rules'] },
): CutProblem | undefined {
  const from = settledFitting(ends.from)
  const to = settledFitting(ends.to)
  if (!from || !to || !cable) return undefined
  return {
    path: path.length,
    depths: cutDepth(from) + cutDepth(to),
    strain: strainAtTension(cable, tension),
    takeUp: from.takeUp + to.takeUp,
    maxRun: Math.min(from.maxRun ?? Infinity, to.maxRun ?? Infinity),
    ...slop(path, rules),
  }
}

/** Gives each cable the length it is to be cut at: its own, or the run's one length. */
function group(cables: CableFigures[], { rules }: SurveyIndex): CableFigures[] {
  const own = cables.flatMap((cable) => (cable.own ? [cable.own] : []))
  const cuts = rules.grouping === 'run' && own.length === cables.length ? groupCuts(own) : undefined
  for (const [i, cable] of cables.entries()) cable.cut = cuts?.[i] ?? cable.own
  return cables
}

/** How much a run's pitch changes at each post passed, in degrees; only where both angles are known. */
export function pitchChanges({ legs, posts }: Course): { post: string; change: number }[] {
  return legs.flatMap(({ angle }, i) => {
    const before = legs[i - 1]?.angle
    const post = posts[i]
    if (!angle || !before || !post) return []
    return [{ post: post.post.id, change: toDegrees(Math.abs(angle.angle - before.angle)) }]
  })
}
