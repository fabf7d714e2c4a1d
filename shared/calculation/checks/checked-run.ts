import type { Bay } from '../../schemas/bay'
import type { Cable, Fitting } from '../../schemas/hardware'
import { bayPath } from '../bay-path'
import type { RunFigures } from '../figure-run'
import { settledFitting } from '../run-ends'
import type { BayAngle } from '../stair-angle'
import type { SurveyIndex } from '../survey-index'

/** A run that can be checked: its cable known, and the middle cable's path. */
export interface CheckedRun {
  figures: RunFigures
  cable: Cable
  /** From the lowest up, nm. */
  heights: readonly number[]
  /** Of the middle cable, from 0. */
  middle: number
  /** D of the middle cable, nm. */
  length: number
}

/** A bay with its clear length along the middle cable, nm. */
export interface BaySpan {
  bay: Bay
  angle: BayAngle
  value: number
}

/** A run with its middle cable. @returns undefined when something is missing for it */
export function asChecked(figures: RunFigures): CheckedRun | undefined {
  const middle = Math.floor(figures.cables.length / 2)
  const { path, impossible } = figures.cables[middle] ?? {}
  const { cable } = figures.course
  if (figures.missing.length > 0 || !cable || !path || impossible === 'readings') return undefined
  return { figures, cable, heights: figures.heights.heights, middle, length: path.length }
}

/** The bays of a run at its middle cable; `unread` are those that only an overall reading covers. */
export function baySpans(
  { figures, heights, middle, length }: CheckedRun,
  { survey, rules }: SurveyIndex,
): { spans: BaySpan[]; unread: string[] } {
  const { legs } = figures.course
  const context = { readAt: survey.guard.readAt, rules }
  const spans: BaySpan[] = []
  const unread: string[] = []
  for (const { bay, readings, angle } of legs) {
    const own = angle && bayPath({ bay, readings, angle }, heights[middle] ?? 0, context)
    if (own) spans.push(own)
    else if (angle && legs.length === 1) spans.push({ bay, angle, value: length })
    else unread.push(bay.id)
  }
  return { spans, unread }
}

/** The fittings of a run's two ends, where they are settled. */
export const fittingsOf = ({ ends }: RunFigures): Fitting[] =>
  [ends.from, ends.to].flatMap((end) => settledFitting(end) ?? [])
