import type { Fitting, Hardware } from '../schemas/hardware'
import type { HouseRules } from '../schemas/house-rules'
import type { Material, Post } from '../schemas/post'
import type { Degrees } from '../units/angle'
import { exceeds } from './round-to-step'

/** The end of a run, as a fitting meets it. */
export interface FittingEnd {
  post: Post
  /** The post's size in the run's direction, nm. */
  size?: number
  angle: Degrees
}

/** Why a fitting was passed over; lengths in nm, angles in degrees. */
export type PassedOver =
  | { because: 'material'; material?: Material }
  | { because: 'cable'; cable: string }
  | { because: 'angle'; angle: Degrees; most: Degrees }
  | { because: 'core-not-listed'; core: Material }
  | { because: 'grip'; core: Material; grip: number; least: number }
  | { because: 'back-wall'; body: number; most: number }
  | { because: 'size-missing' }
  | { because: 'longer-body'; body: number; chosen: number }
  | { because: 'price' }
  | { because: 'id' }

export interface FittingChoice {
  chosen?: Fitting
  passedOver: { fitting: Fitting; reason: PassedOver }[]
}

/** Angles within this of each other are equal: noise of acos, degrees. */
const ANGLE_NOISE = 1e-7

/** What the choice is made from. */
export interface FittingStock {
  /** The id of the run's cable. */
  cable: string
  fittings: Hardware['fittings']
  backWall: HouseRules['backWall']
}

/**
 * The fitting for an end of a run.
 *
 * Formula: it suits when the post's material and the cable are listed, the angle is within `maxAngle` and, if
 * drilled, `body − cover ≥ minGrip[core]` and `body ≤ size − backWall`; core is the post's core, else its material, and
 * one without a `minGrip` is not suited. Of those that suit: shortest body, then lowest price (none last), then id.
 * Units: nm and degrees.
 * Source: section 5 of the calculation.
 *
 * @example a 1 1/2 in body in a 3 1/2 in softwood post, no cover, minGrip 1 1/2 in, back wall 1/2 in: suits
 */
export function chooseFitting(end: FittingEnd, stock: FittingStock): FittingChoice {
  const passedOver: FittingChoice['passedOver'] = []
  const suited: Fitting[] = []
  for (const fitting of stock.fittings) {
    const reason = whyUnsuited(fitting, end, stock)
    if (reason) passedOver.push({ fitting, reason })
    else suited.push(fitting)
  }
  const [chosen, ...others] = suited.sort(byPreference)
  if (chosen) for (const fitting of others) passedOver.push({ fitting, reason: whyBehind(fitting, chosen) })
  return { chosen, passedOver }
}

function whyUnsuited(fitting: Fitting, end: FittingEnd, stock: FittingStock): PassedOver | undefined {
  const { material } = end.post
  if (!material || !fitting.materials.includes(material)) return { because: 'material', material }
  if (!fitting.cables.includes(stock.cable)) return { because: 'cable', cable: stock.cable }
  if (end.angle > fitting.maxAngle + ANGLE_NOISE) {
    return { because: 'angle', angle: end.angle, most: fitting.maxAngle }
  }
  return fitting.mount === 'drilled'
    ? whyTooShallowOrDeep(fitting, end, { material, backWall: stock.backWall })
    : undefined
}

function whyTooShallowOrDeep(
  { body, minGrip }: Fitting,
  { post, size }: FittingEnd,
  { material, backWall }: { material: Material; backWall: number },
): PassedOver | undefined {
  const core = post.core ?? material
  const least = minGrip[core]
  if (least === undefined) return { because: 'core-not-listed', core }
  const grip = body - (post.cover ?? 0)
  if (exceeds(least, grip)) return { because: 'grip', core, grip, least }
  if (size === undefined) return { because: 'size-missing' }
  const most = size - backWall
  return exceeds(body, most) ? { because: 'back-wall', body, most } : undefined
}

const priceOf = (fitting: Fitting): number => fitting.price ?? Infinity

/** Orders fittings that suit: shortest body, then lowest price, then id. */
export function byPreference(a: Fitting, b: Fitting): number {
  if (a.body !== b.body) return a.body - b.body
  if (priceOf(a) !== priceOf(b)) return priceOf(a) < priceOf(b) ? -1 : 1
  return a.id < b.id ? -1 : 1
}

function whyBehind(fitting: Fitting, chosen: Fitting): PassedOver {
  if (fitting.body !== chosen.body) return { because: 'longer-body', body: fitting.body, chosen: chosen.body }
  return { because: priceOf(fitting) === priceOf(chosen) ? 'id' : 'price' }
}
