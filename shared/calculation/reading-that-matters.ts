import type { ReadingPlace } from '../schemas/bay'
import type { HouseRules } from '../schemas/house-rules'
import type { BayPath } from './bay-path'
import type { CablePath } from './cable-path'
import { type CutProblem, cutLength } from './cut-length'
import { benchLimits, stackLimits } from './stack-limits'

/** A reading that can be taken again. */
export type TakenReading =
  | { what: 'bay'; bay: string; place: ReadingPlace | 'both' }
  | { what: 'overall' }
  | { what: 'post'; post: string; side: 'along' | 'across' }
  | { what: 'rise-and-going'; bay: string }
  | { what: 'gauge'; bay: string }

export interface ReadingThatMatters {
  reading: TakenReading
  /** The cable looked at: the one furthest from being *shop*. */
  cable: number
  /** U as it is, and with the limit of this reading halved; nm. */
  before: number
  after: number
  /** Whether halving it makes that cable *shop*. */
  makesShop: boolean
}

type Rules = Pick<HouseRules, 'stacking' | 'cutLimit' | 'seatLimit' | 'reserve' | 'cutStep' | 'trim'>

interface Candidate {
  reading: TakenReading
  /** The limits of the path with this one halved. */
  limits: number[]
}

/**
 * The single reading that, taken again, does most to let a *site* cable be crimped in the shop.
 *
 * Formula: only if the cable would be *shop* with U = Us. The limit of each reading is halved in turn (a bay, the
 * overall reading, a post's size, rise and going or the gauge), U stacked again, and the least U wins; on a
 * tie the first along the run.
 * Units: nm.
 * Source: section 6 of the calculation.
 *
 * @returns undefined when no reading can make the difference
 * @example bays with limits of 1/16 and, read four times, 1/32 in: the first is the one to take again
 */
export function readingThatMatters(
  path: CablePath,
  problem: CutProblem,
  rules: Rules,
): Omit<ReadingThatMatters, 'cable'> | undefined {
  const isShop = (u: number) => cutLength({ ...problem, u }, rules).mode === 'shop'
  if (isShop(problem.u) || !isShop(problem.us)) return undefined
  let best: Omit<ReadingThatMatters, 'cable'> | undefined
  for (const { reading, limits } of candidates(path)) {
    const after = stackLimits([...limits, ...benchLimits(rules)], rules.stacking)
    if (after < (best?.after ?? problem.u))
      best = { reading, before: problem.u, after, makesShop: isShop(after) }
  }
  return best
}

function candidates({ terms, readingLimits, tapeLimit, angleLimit }: CablePath): Candidate[] {
  return terms.flatMap((term, i) => {
    const halved = readingLimits.map((limit, j) => (j === i ? limit / 2 : limit))
    const found: Candidate[] = [{ reading: readingOf(term), limits: [...halved, tapeLimit, angleLimit] }]
    if (term.kind === 'bay' && term.angleLimit > 0) {
      const what = term.angle.source === 'gauge' ? ('gauge' as const) : ('rise-and-going' as const)
      const angles = angleLimit - term.angleLimit / 2
      found.push({ reading: { what, bay: term.bay.id }, limits: [...readingLimits, tapeLimit, angles] })
    }
    return found
  })
}

function readingOf(term: CablePath['terms'][number]): TakenReading {
  if (term.kind === 'overall') return { what: 'overall' }
  if (term.kind === 'post') return { what: 'post', post: term.post.post.id, side: term.post.side }
  return { what: 'bay', bay: term.bay.id, place: placeReadLess(term) }
}

/** The place with fewer readings decides a bay's limit. */
function placeReadLess({ readings: { top, bottom } }: BayPath): ReadingPlace | 'both' {
  if (!bottom) return 'top'
  if (!top) return 'bottom'
  if (top.count === bottom.count) return 'both'
  return top.count < bottom.count ? 'top' : 'bottom'
}
