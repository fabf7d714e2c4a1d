import type { Course } from './course'
import type { RunEnds } from './run-ends'
import { needsSize } from './run-ends'

/** What a run lacks before its cables can be computed. */
export type Missing =
  | { what: 'reading'; bay: string }
  | { what: 'angle'; bay: string }
  | { what: 'size'; post: string; side: 'along' | 'across' }

/**
 * What a run still lacks: readings of its bays and sizes of the posts it passes, unless it was read overall; the
 * angle of each of its stairs; the size of an end post that a drilled fitting depends on.
 *
 * Source: sections 3 and 5 of the calculation.
 */
export function missingReadings({ legs, posts, overall }: Course, { from, to }: RunEnds): Missing[] {
  const missing: Missing[] = []
  const readOverall = overall.top !== undefined || overall.bottom !== undefined
  for (const { bay, readings, angle } of legs) {
    if (!readOverall && !readings.top && !readings.bottom) missing.push({ what: 'reading', bay: bay.id })
    if (!angle) missing.push({ what: 'angle', bay: bay.id })
  }
  const passed = readOverall ? [] : posts.slice(1, -1)
  const ends = [from, to].filter(needsSize).map((end) => end.post)
  for (const { post, size, side } of [...passed, ...ends]) {
    if (size === undefined) missing.push({ what: 'size', post: post.id, side })
  }
  return missing
}
