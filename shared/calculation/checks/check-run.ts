import type { HouseRules } from '../../schemas/house-rules'
import { thermalTensionChange } from '../cable-properties'
import type { Opening } from '../guard-opening'
import { type CheckedRun, fittingsOf } from './checked-run'

/** What is checked of a run as a whole; N and nm. */
export interface RunCheck {
  run: string
  /** Id in the catalogue. */
  cable: string
  /** Of its cables’ centres, from the lowest up. */
  heights: readonly number[]
  /** What the cables fill. */
  opening: Opening
  tension: number
  /** The tension at the house's cold and hot design temperatures. */
  whenCold: number
  whenHot: number
  /** Undefined where the catalogue does not say. */
  breakingLoad?: number
  /** The least of the two fittings'. */
  rating?: number
}

/**
 * A run's tension, and what cold and heat make of it between posts that do not give.
 *
 * Formula: `T + EA · α · (tensionedAt − temperature)`.
 * Units: N; temperatures in °C.
 * Source: section 7 of the calculation.
 *
 * @example 150 lbf at 15 °C, EA 151 000 lbf: 222.48 lbf at −15 °C
 */
export function checkRun(run: CheckedRun, rules: HouseRules): RunCheck {
  const { figures, cable, heights } = run
  const { tension } = figures.course
  const at = (degrees: number) =>
    tension + thermalTensionChange(cable.axialStiffness, rules.tensionedAt - degrees)
  const ratings = fittingsOf(figures).flatMap(({ rating }) => rating ?? [])
  return {
    run: figures.course.run.id,
    cable: cable.id,
    heights,
    opening: figures.opening,
    tension,
    whenCold: at(rules.coldest),
    whenHot: at(rules.hottest),
    breakingLoad: cable.breakingLoad,
    rating: ratings.length > 0 ? Math.min(...ratings) : undefined,
  }
}
