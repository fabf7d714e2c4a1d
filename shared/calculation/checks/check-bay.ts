import type { Cable } from '../../schemas/hardware'
import type { HouseRules } from '../../schemas/house-rules'
import type { BaySpan, CheckedRun } from './checked-run'
import type { GuardFigures } from './guard-figures'
import { type InfillAnswer, infillLoad } from './infill-load'
import { type OpeningsAtRest, openingsAtRest } from './openings-at-rest'
import { pushThrough } from './push-through'
import { spacersNeeded } from './spacers-needed'
import { type StairTriangle, stairTriangle } from './stair-triangle'
import type { TautCable } from './taut-cable'
import { type LookedUp, leastWireTension, mostWireDeflection } from './wire-tables'

/** Everything checked of one bay of a run, at the run's middle cable; nm and N. */
export interface BayCheck {
  run: string
  bay: string
  /** The cable it was checked at, from 1. */
  cable: number
  isStair: boolean
  /** From the horizontal, radians. */
  theta: number
  /** Clear, along the cable. */
  length: number
  spacers: number
  /** Between posts or spacers. */
  span: number
  spacersNeeded: number
  openings: OpeningsAtRest
  /** The sphere that must not pass here. */
  sphere: number
  /** The push that forces it through; undefined for a single cable. */
  push?: number
  /** Undefined when the rules set no load, or for a single cable. */
  infill?: InfillAnswer
  /** On stairs without a rail at the bottom of the opening. */
  triangle?: StairTriangle
  /** Where the rules go by the wire tables. */
  wire?: { leastTension: LookedUp; mostDeflection: LookedUp }
}

/**
 * The checks of one bay of a run.
 *
 * The bay's span, openings and loads are taken at the run's middle cable (⌊n / 2⌋ from 0), with the widest pitch of the
 * run and that cable's path as the length that stretches.
 * Units: nm and N.
 * Source: section 8 of the calculation.
 *
 * @returns undefined when there is no cable
 */
export function checkBay(
  run: CheckedRun,
  term: BaySpan,
  { guard, rules }: { guard: GuardFigures; rules: HouseRules },
): BayCheck | undefined {
  const { figures, cable, heights, middle, length } = run
  const { bay, angle, value } = term
  const theta = angle.angle
  const isStair = bay.kind === 'stair'
  const openings = openingsAtRest(heights, figures.opening, { diameter: cable.diameter, theta })
  if (!openings) return undefined
  const span = value / (bay.spacers + 1)
  const { axialStiffness } = cable
  const taut: TautCable = { span, tension: figures.course.tension, axialStiffness, length }
  const sphere = isStair ? guard.stairSphere : guard.sphere
  const load = guard.rules?.infillLoad
  const { pitch } = openings
  return {
    run: figures.course.run.id,
    bay: bay.id,
    cable: middle + 1,
    isStair,
    theta,
    length: value,
    spacers: bay.spacers,
    span,
    spacersNeeded: spacersNeeded(value, rules.wideBay),
    openings,
    sphere,
    ...(pitch === undefined
      ? {}
      : {
          push: pushThrough(taut, { pitch, diameter: cable.diameter, sphere }),
          ...(load ? { infill: infillLoad(taut, load, pitch) } : {}),
          ...wireTables(guard, cable, { pitch, span }),
        }),
    ...(isStair && theta > 0 ? { triangle: triangleOf(run, term, guard) } : {}),
  }
}

function wireTables({ rules }: GuardFigures, wire: Cable, { pitch, span }: { pitch: number; span: number }) {
  if (!rules?.wireTables) return {}
  return {
    wire: {
      leastTension: leastWireTension(wire, pitch, span),
      mostDeflection: mostWireDeflection(wire, pitch, span),
    },
  }
}

/** The lowest member is what closes the opening at its bottom, or the lowest cable where that is the nosing line. */
function triangleOf({ figures, cable, heights }: CheckedRun, { bay, angle }: BaySpan, guard: GuardFigures) {
  const { bottom } = figures.opening
  const lowest = (heights[0] ?? 0) - cable.diameter / 2 / Math.cos(angle.angle)
  const flight = { rise: bay.rise, going: bay.going, theta: angle.angle, tallest: guard.riser }
  return stairTriangle(flight, bottom > 0 ? bottom : lowest)
}
