import type { HouseRules } from '../schemas/house-rules'
import type { Length } from '../units/length'
import { stretchAtTension } from './cable-properties'
import { exceeds, roundUpToStep } from './round-to-step'
import type { Slop } from './stack-limits'

/** What a cut length is worked out from; nm, unrounded. */
export interface CutProblem extends Slop {
  /** D */
  path: number
  /** How far past each post's face the cable's ends sit, added up. */
  depths: number
  /** At tension, as a share of D. */
  strain: number
  /** Take-up of both fittings, added up. */
  takeUp: number
  /** The shorter `maxRun` of the two fittings; Infinity without one. */
  maxRun: number
}

interface Common {
  /** D + the depths: the length that sits exactly, untensioned. */
  base: number
  stretch: number
  /** Take-up that may be used. */
  limit: number
  /** The longest D that this cable and these fittings can be tensioned over. */
  longest: number
}

/** Both ends crimped in the shop. */
export interface ShopCut extends Common {
  mode: 'shop'
  cut: Length
  slack: number
  u: number
  planned: number
  worst: number
}

/** One end crimped in the shop, the other cut at the mark on site. */
export interface SiteCut extends Common {
  mode: 'site'
  cut: Length
  finish: number
  u: number
  planned: number
  worst: number
}

export type CutLength = ShopCut | SiteCut | (Common & { mode: 'none' })

type CutRules = Pick<HouseRules, 'reserve' | 'cutStep' | 'trim'>

/**
 * The length to cut, and where: the least slop that still cannot come out too short.
 *
 * Formula: base = D + depths; stretch = D · strain; limit = takeUp · (1 − reserve);
 * longest = min(maxRun, (limit − Us) / strain); D beyond it: *none*.
 * C = base + U rounded up to `cutStep`, slack = C − base; slack + U + stretch ≤ limit: *shop*, planned = slack +
 * stretch, worst = planned + U. Else *site*: cut = base + U + trim rounded up, finish = base, planned = stretch, worst =
 * Us + stretch, and the u given is Us.
 * Units: nm, unrounded but for the cut.
 * Source: section 6 of the calculation.
 *
 * @example D 94.0895833, depths 1.5, U 0.1435832 in: cut 95.75 in, slack 0.1604167 in, *shop*
 */
export function cutLength(problem: CutProblem, { reserve, cutStep, trim }: CutRules): CutLength {
  const { path, depths, strain, takeUp, maxRun, u, us } = problem
  const base = path + depths
  const stretch = stretchAtTension(path, strain)
  const limit = takeUp * (1 - reserve)
  const longest = Math.max(0, Math.min(maxRun, (limit - us) / strain))
  if (exceeds(path, longest)) return { mode: 'none', base, stretch, limit, longest }
  const cut = roundUpToStep(base + u, cutStep) as Length
  if (fitsTakeUp(cut, { base, u, stretch, limit })) return shopCut(cut, { base, stretch, limit, longest, u })
  const long = roundUpToStep(base + u + trim, cutStep) as Length
  const worst = us + stretch
  return {
    mode: 'site',
    base,
    stretch,
    limit,
    longest,
    cut: long,
    finish: base,
    u: us,
    planned: stretch,
    worst,
  }
}

/** Whether a cut can be crimped at both ends in the shop: slack + U + stretch ≤ limit. */
export const fitsTakeUp = (
  cut: number,
  { base, u, stretch, limit }: Pick<ShopCut, 'base' | 'u' | 'stretch' | 'limit'>,
): boolean => !exceeds(cut - base + u + stretch, limit)

/** The figures of a shop cable cut to a given length. */
export function shopCut(
  cut: Length,
  { base, stretch, limit, longest, u }: Pick<ShopCut, 'base' | 'stretch' | 'limit' | 'longest' | 'u'>,
): ShopCut {
  const slack = cut - base
  const planned = slack + stretch
  return { mode: 'shop', base, stretch, limit, longest, cut, slack, u, planned, worst: planned + u }
}
