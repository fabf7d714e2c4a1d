import type { Fitting } from '../../schemas/hardware'
import type { HouseRules } from '../../schemas/house-rules'
import type { Core } from '../../schemas/post'
import { toMillimetres } from '../../units/length'
import type { RunEnd } from '../run-ends'
import { settledFitting } from '../run-ends'
import {
  cantileverDeflection,
  cantileverMoment,
  deflectionAt,
  proppedDeflection,
  proppedMoment,
} from './beam'
import type { CheckedRun } from './checked-run'
import type { GuardFigures } from './guard-figures'
import { type Allowable, allowableBending, rectangleSection } from './wood-section'

export type Support = 'propped' | 'cantilever'

/** How one kind of support answers: moment N·mm, stress N/mm², deflection mm. */
export interface SupportAnswer {
  moment: number
  /** Undefined where the core is no wood, or its size is unknown. */
  stress?: number
  deflection?: number
}

/** Everything checked of the post at one end of a run. */
export interface PostCheck {
  run: string
  post: string
  /** n · T, N. */
  pull: number
  propped: SupportAnswer
  cantilever: SupportAnswer
  /** What the survey says of the top rail; undefined when it says nothing. */
  support?: Support
  core?: Core
  /** Of the wooden core, in the direction of the run and square to it, nm. */
  section?: { along: number; across: number }
  allowable?: Allowable
  /** The rules' single load at the top, the post standing free. */
  topLoad?: SupportAnswer & { force: number }
  fitting?: Fitting
  /** Wood left behind a drilled body, and beside its hole in the core, nm. */
  backLeft?: number
  edgeLeft?: number
}

/**
 * The checks of the post at one end of a run.
 *
 * Formula: pull `n · T`; moment standing free `T · Σh`, held by the top rail the greatest of a simple beam between foot
 * and rail; stress moment / S of a wooden core, its size less the cover on both sides. The deflection is that of the top,
 * or held by the rail that at mid-height.
 * Units: N, N·mm, N/mm², mm; sizes in nm.
 * Source: section 9 of the calculation; AISC Manual beam tables; NDS Supplement.
 *
 * @example eleven cables of 200 lbf at 3 … 33 in, 3 1/2 in square, rail at 36 in: pull 2200 lbf, 5541.69 psi standing free
 */
export function checkPost(
  run: CheckedRun,
  end: RunEnd,
  { guard, rules }: { guard: GuardFigures; rules: HouseRules },
): PostCheck {
  const { post } = end.post
  const loads = { force: run.figures.course.tension, heights: run.heights.map(toMillimetres) }
  const length = toMillimetres(run.figures.opening.top)
  const core = coreOf(post)
  const section = isWood(core) ? sectionOf(end) : undefined
  const allowable = section && allowableOf(post.lumber, rules)
  const sized = section && rectangleSection(toMillimetres(section.along), toMillimetres(section.across))
  // What lies above the rail is said elsewhere and bends no post below it.
  const below = { ...loads, heights: loads.heights.filter((height) => height < length) }
  const beam = sized && allowable && { height: length, stiffness: allowable.lumber.modulus * sized.inertia }
  const answer = (moment: number, deflection: number | undefined): SupportAnswer => ({
    moment,
    ...(sized ? { stress: moment / sized.modulus } : {}),
    ...(deflection === undefined ? {} : { deflection }),
  })
  const top = guard.rules?.topLoad
  const ties = post.railTies ?? guard.guard.railTies
  const height = toMillimetres(guard.guard.height)
  return {
    run: run.figures.course.run.id,
    post: post.id,
    pull: loads.force * loads.heights.length,
    propped: answer(
      proppedMoment(below, length),
      beam && deflectionAt(length / 2, below, (x, a) => proppedDeflection(beam, x, a)),
    ),
    cantilever: answer(
      cantileverMoment(loads),
      beam && deflectionAt(length, loads, (x, a) => cantileverDeflection(beam, x, a)),
    ),
    ...(ties === undefined ? {} : { support: ties ? 'propped' : 'cantilever' }),
    core,
    section,
    allowable,
    ...(top
      ? {
          topLoad: {
            force: top.value,
            ...answer(top.value * height, beam && top.value * cantileverDeflection(beam, height, height)),
          },
        }
      : {}),
    ...holeRoom(end, section),
  }
}

/** What is under the cover; undefined for a veneered post whose core nobody noted. */
function coreOf({ core, material }: RunEnd['post']['post']): Core | undefined {
  if (core) return core
  return material === 'veneered' ? undefined : material
}

export const isWood = (core: Core | undefined): boolean => core === 'softwood' || core === 'hardwood'

/** The core in the direction of the run and square to it. @returns undefined when a size is missing or all cover */
function sectionOf({ post: { post, side } }: RunEnd): PostCheck['section'] {
  const [along, across] = side === 'along' ? [post.along, post.across] : [post.across, post.along]
  if (along === undefined || across === undefined) return undefined
  const covers = 2 * (post.cover ?? 0)
  if (along <= covers || across <= covers) return undefined
  return { along: along - covers, across: across - covers }
}

/** The lumber a post names, else the house's first. */
function allowableOf(named: string | undefined, rules: HouseRules): Allowable | undefined {
  const lumber = rules.lumber.find(({ id }) => id === named) ?? rules.lumber[0]
  return lumber && allowableBending(lumber, rules)
}

function holeRoom(
  end: RunEnd,
  section: PostCheck['section'],
): Pick<PostCheck, 'fitting' | 'backLeft' | 'edgeLeft'> {
  const fitting = settledFitting(end)
  if (!fitting || fitting.mount !== 'drilled') return { fitting }
  const { size } = end.post
  return {
    fitting,
    ...(size === undefined ? {} : { backLeft: size - fitting.body }),
    ...(section && fitting.hole !== undefined ? { edgeLeft: (section.across - fitting.hole) / 2 } : {}),
  }
}
