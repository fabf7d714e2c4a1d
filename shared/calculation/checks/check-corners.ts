import type { Fitting } from '../../schemas/hardware'
import type { HouseRules } from '../../schemas/house-rules'
import { type PostSize } from '../post-size'
import { settledFitting } from '../run-ends'
import type { CheckedRun } from './checked-run'
import { type CornerHoles, cornerHoles, leastApart } from './corner-holes'

/** One run's end at a post that another run ends at too; heights and lengths in nm. */
export interface EndHole {
  run: string
  fitting: Fitting
  /** Of the hole's centre, from the lowest up. */
  heights: readonly number[]
  post: PostSize
}

/** Two runs that end at one post with drilled fittings. */
export interface CornerCheck extends CornerHoles {
  post: string
  /** `turned`: drilled from adjacent faces; `opposite`: end to end, from opposite ones. */
  kind: 'turned' | 'opposite'
  a: EndHole
  b: EndHole
  along: number
  across: number
  /** The least difference in height between their holes. */
  apart: number
}

/**
 * Every pair of runs that end at one post with drilled fittings: the room their holes leave each other.
 *
 * Turned runs are those of section 9. Runs on opposite faces overlap by what their bodies are longer together than the
 * post less `cornerWeb`.
 * Units: nm.
 * Source: section 9 of the calculation; common practice, no source.
 */
export function checkCorners(runs: readonly CheckedRun[], rules: HouseRules): CornerCheck[] {
  const ends = new Map<string, EndHole[]>()
  for (const { figures, heights } of runs) {
    for (const end of [figures.ends.from, figures.ends.to]) {
      const fitting = settledFitting(end)
      if (fitting?.mount !== 'drilled') continue
      const { id } = end.post.post
      const hole = { run: figures.course.run.id, fitting, heights, post: end.post }
      ends.set(id, [...(ends.get(id) ?? []), hole])
    }
  }
  return [...ends.values()].flatMap((holes) =>
    holes.flatMap((first, i) =>
      holes.slice(i + 1).flatMap((second) => checkPair(first, second, rules) ?? []),
    ),
  )
}

function checkPair(first: EndHole, second: EndHole, rules: HouseRules): CornerCheck | undefined {
  const { id, along, across } = first.post.post
  if (first.fitting.hole === undefined || second.fitting.hole === undefined) return undefined
  const [a, b] = first.post.side === 'along' ? [first, second] : [second, first]
  const apart = leastApart(a.heights, b.heights)
  const holeOf = ({ fitting }: EndHole) => ({ body: fitting.body, diameter: fitting.hole ?? 0 })
  if (a.post.side !== b.post.side) {
    if (along === undefined || across === undefined) return undefined
    const holes = cornerHoles({ a: holeOf(a), b: holeOf(b) }, { along, across }, rules)
    return { post: id, kind: 'turned', a, b, along, across, apart, ...holes }
  }
  const size = a.post.size
  if (size === undefined) return undefined
  const overlap = a.fitting.body + b.fitting.body - (size - rules.cornerWeb)
  const needed = overlap > 1e-3 ? (holeOf(a).diameter + holeOf(b).diameter) / 2 + rules.cornerWeb : 0
  return {
    post: id,
    kind: 'opposite',
    a,
    b,
    along: size,
    across: across ?? size,
    apart,
    overlap,
    stagger: needed,
  }
}
