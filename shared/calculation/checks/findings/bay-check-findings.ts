import type { HouseRules } from '../../../schemas/house-rules'
import type { FigureSource } from '../../../schemas/guard-rules'
import type { Notice } from '../../findings/notice'
import { ruleBehind } from '../../guard-rules/published-rules'
import { exceeds } from '../../round-to-step'
import type { BayCheck } from '../check-bay'
import type { RunCheck } from '../check-run'
import type { GuardFigures } from '../guard-figures'

export interface BayContext {
  guard: GuardFigures
  rules: HouseRules
  /** The run it belongs to. */
  run: RunCheck
}

/**
 * What the checks of a bay come to.
 *
 * A sphere passes an opening of its own size: the opening has to be smaller.
 * Source: sections 8 of the calculation; the section of the guard rules stands with each finding.
 */
export function bayCheckFindings(bay: BayCheck, context: BayContext): Notice[] {
  return [
    ...openingFindings(bay, context),
    ...triangleFindings(bay, context),
    ...spanFindings(bay, context.rules),
    ...pushFindings(bay, context.rules),
    ...infillFindings(bay, context),
  ]
}

const placeOf = ({ run, bay }: BayCheck) => ({ run, bay })

/** An opening lets the sphere through when it is no smaller than it. */
const passes = (opening: number, sphere: number): boolean => !exceeds(sphere, opening)

function openingFindings(bay: BayCheck, { guard }: BayContext): Notice[] {
  const { openings, sphere, isStair } = bay
  const source: FigureSource | undefined = isStair
    ? (guard.rules?.stairSphere ?? guard.rules?.sphere)
    : guard.rules?.sphere
  const say = (
    code: string,
    opening: number,
    { where, limit, cure }: { where: string; limit: number; cure: string },
  ) => {
    const notice: Notice = {
      level: 'stop',
      code,
      where: placeOf(bay),
      phrase: [
        `Bay ${bay.bay}: the opening ${where} is `,
        { length: opening },
        `${isStair ? ' square to the cables' : ''}, and no sphere of `,
        { length: limit },
        ` may pass. ${cure}`,
      ],
      ...(guard.rules && source ? { rule: ruleBehind(guard.rules, source) } : {}),
    }
    return passes(opening, limit) ? [notice] : []
  }
  const top = topSphere(bay, guard)
  return [
    ...(openings.between === undefined
      ? []
      : say('opening-between', openings.between, {
          where: `between cables ${openings.above} and ${(openings.above ?? 0) + 1}`,
          limit: sphere,
          cure: 'Set the cables closer.',
        })),
    ...say('opening-bottom', openings.bottom, {
      where: 'below the lowest cable',
      limit: sphere,
      cure: 'Set a cable lower.',
    }),
    ...say('opening-top', openings.top, {
      where: 'above the highest cable',
      limit: top,
      cure: 'Set a cable higher.',
    }),
  ]
}

/**
 * The sphere that must not pass above the highest cable: a larger one where the rules allow it and all of the opening
 * lies there.
 *
 * Units: nm.
 * Source: section 8 of the calculation; the guard rules' own section for the larger sphere.
 */
export function topSphere({ sphere, isStair, openings }: BayCheck, { guard, rules }: GuardFigures): number {
  const upper = rules?.upperSphere
  if (!upper || isStair || guard.sphere !== undefined) return sphere
  return exceeds(upper.above, openings.highest) ? sphere : upper.value
}

function triangleFindings(bay: BayCheck, { guard }: BayContext): Notice[] {
  const limit = guard.rules?.stairTriangle
  const { triangle } = bay
  if (!guard.rules || !limit || !triangle || !passes(triangle.sphere, limit.value)) return []
  const steps = triangle.assumed ? ' (steps reckoned, not measured one by one)' : ''
  return [
    {
      level: 'stop',
      code: 'opening-stair-triangle',
      where: placeOf(bay),
      phrase: [
        `Bay ${bay.bay}: a sphere of `,
        { length: triangle.sphere },
        ' stands in the triangle of riser ',
        { length: triangle.riser },
        ', tread ',
        { length: triangle.tread },
        ` and the lowest member${steps}; the rules allow none of `,
        { length: limit.value },
        '. Set the lowest cable or a rail lower.',
      ],
      rule: ruleBehind(guard.rules, limit),
    },
  ]
}

function spanFindings(bay: BayCheck, { wideBay }: HouseRules): Notice[] {
  const { span, spacers, spacersNeeded: needed } = bay
  if (!exceeds(span, wideBay)) return []
  const more = needed - spacers
  return [
    {
      level: 'check',
      code: 'wide-bay',
      where: placeOf(bay),
      phrase: [
        `Bay ${bay.bay}: the cables span `,
        { length: span },
        spacers > 0 ? ' between posts and spacers, more than ' : ', more than ',
        { length: wideBay },
        `. ${more} ${spacers > 0 ? 'more ' : ''}${more === 1 ? 'spacer cures' : 'spacers cure'} it.`,
      ],
    },
  ]
}

function pushFindings(bay: BayCheck, { leastPush }: HouseRules): Notice[] {
  const { push, sphere } = bay
  if (leastPush === undefined || push === undefined || push >= leastPush * (1 - 1e-12)) return []
  return [
    {
      level: 'check',
      code: 'push-low',
      where: placeOf(bay),
      phrase: [
        `Bay ${bay.bay}: `,
        { force: push },
        ' pushes a smooth sphere of ',
        { length: sphere },
        ' through, the house asks for ',
        { force: leastPush },
        '. More tension, a spacer or closer cables cure it.',
      ],
    },
  ]
}

/** The cable's tension under the infill load against what the cable and its fittings take. */
function infillFindings(bay: BayCheck, { guard, run }: BayContext): Notice[] {
  const { infill } = bay
  const load = guard.rules?.infillLoad
  if (!infill || !load || !guard.rules) return []
  const rule = ruleBehind(guard.rules, load)
  const over = (most: number | undefined, what: string): Notice[] =>
    most === undefined || infill.tension <= most
      ? []
      : [
          {
            level: 'stop',
            code: 'infill-overload',
            where: placeOf(bay),
            phrase: [
              `Bay ${bay.bay}: under the infill load a cable is pulled with `,
              { force: infill.tension },
              `, above ${what} of `,
              { force: most },
              '. Use stronger parts or shorter spans.',
            ],
            rule,
          },
        ]
  return [...over(run.breakingLoad, 'its breaking load'), ...over(run.rating, 'its fittings’ rating')]
}
