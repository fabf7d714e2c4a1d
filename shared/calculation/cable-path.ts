import type { Guard } from '../schemas/guard'
import type { HouseRules } from '../schemas/house-rules'
import { type BayPath, bayPath } from './bay-path'
import { clearLength, type GapReadings } from './clear-length'
import type { Course } from './course'
import { type PostPath, postPath } from './post-path'
import { tapeLimit } from './tape-limit'

/** The overall reading of a run at a cable's height; nm, unrounded. */
export interface OverallPath {
  kind: 'overall'
  readings: GapReadings
  value: number
  count: number
  readingLimit: number
  tapeLimit: number
}

export type PathTerm = BayPath | PostPath | OverallPath

/** The path of a cable from end face to end face, D, with everything that stacks; nm, unrounded. */
export interface CablePath {
  /** D */
  length: number
  terms: PathTerm[]
  /** One for each independent reading. */
  readingLimits: number[]
  /** Added up along the run: one tape. */
  tapeLimit: number
  /** Added up along the run: one gauge. */
  angleLimit: number
}

/** What a path is computed under. */
export interface PathContext {
  readAt: Guard['readAt']
  rules: HouseRules
}

/**
 * The path of a cable at a height: from the face of one end post to the face of the other.
 *
 * Formula: with an overall reading, D is that reading at the cable's height, with one reading limit and its tape
 * limit. Otherwise D = Σ bays + Σ posts passed; reading limits are independent, tape limits and angle limits add up.
 * Units: nm, unrounded.
 * Source: section 3 of the calculation.
 *
 * @returns undefined when a reading, an angle or the size of a post passed is missing
 * @example bays of 46.4645833 and 44.125 in and a post of 3.5 in between: 94.0895833 in
 */
export function cablePath(course: Course, height: number, context: PathContext): CablePath | undefined {
  return overallPath(course.overall, height, context) ?? summedPath(course, height, context)
}

/** D from the overall readings alone. @returns undefined when there are none. */
export function overallPath(
  overall: GapReadings,
  height: number,
  { readAt, rules }: PathContext,
): CablePath | undefined {
  const read = clearLength(overall, height, readAt)
  if (!read) return undefined
  const term: OverallPath = {
    kind: 'overall',
    readings: overall,
    value: read.value,
    count: read.count,
    readingLimit: rules.readingLimit / Math.sqrt(read.count),
    tapeLimit: tapeLimit(read.value, rules.tapeClass),
  }
  return {
    length: term.value,
    terms: [term],
    readingLimits: [term.readingLimit],
    tapeLimit: term.tapeLimit,
    angleLimit: 0,
  }
}

/** D as the sum of bays and posts passed. @returns undefined when one of them is missing. */
export function summedPath(
  { legs, posts }: Course,
  height: number,
  context: PathContext,
): CablePath | undefined {
  const path: CablePath = { length: 0, terms: [], readingLimits: [], tapeLimit: 0, angleLimit: 0 }
  const add = (term: BayPath | PostPath) => {
    path.terms.push(term)
    path.length += term.value
    path.readingLimits.push(term.readingLimit)
    if (term.kind === 'post') return
    path.tapeLimit += term.tapeLimit
    path.angleLimit += term.angleLimit
  }
  for (const [i, { bay, readings, angle }] of legs.entries()) {
    const post = posts[i]
    if (!angle || !post) return undefined
    if (i > 0) {
      const before = legs[i - 1]?.angle?.angle ?? 0
      const passed = postPath(post, { before, after: angle.angle }, context.rules.readingLimit)
      if (!passed) return undefined
      add(passed)
    }
    const along = bayPath({ bay, readings, angle }, height, context)
    if (!along) return undefined
    add(along)
  }
  return path
}
