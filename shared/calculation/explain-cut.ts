import type { HouseRules } from '../schemas/house-rules'
import type { CutLength, CutProblem, ShopCut, SiteCut } from './cut-length'
import type { Course } from './course'
import type { Phrase } from './phrase'
import { roundUpToStep } from './round-to-step'
import type { CableWorking, WorkingLine } from './working'

/** What the lines of a cut are explained from. */
export interface CutContext {
  course: Course
  problem: CutProblem
  /** As cut on its own, and as it is to be cut. */
  own: CutLength
  cut: CutLength
  rules: HouseRules
}

type CutLines = Required<Pick<CableWorking, 'base' | 'slop' | 'siteSlop' | 'stretch' | 'limit' | 'longest'>>

/** The figures that decide how a cable is cut. */
export function explainFigures({ course, problem, cut, rules }: CutContext): CutLines {
  const { cable, tension } = course
  const stacked = rules.stacking === 'rss' ? 'root of the sum of the squares' : 'plain sum'
  const stretchReason: Phrase = [
    'of the path at ',
    { force: tension },
    ': elastic ',
    { percent: cable ? tension / cable.axialStiffness : 0 },
    ' and settling ',
    { percent: cable?.settlingStretch ?? 0 },
  ]
  const takeUp: Phrase = [
    'take-up of both fittings, ',
    { length: problem.takeUp },
    ', less ',
    { percent: rules.reserve },
    ' kept for tensioning again',
  ]
  const bound =
    cut.longest === problem.maxRun
      ? 'the fittings’ own longest run'
      : 'the take-up less cutting and seating, over the strain at tension'
  return {
    base: { label: ['Sits exactly'], value: cut.base, reason: ['path and both depths, untensioned'] },
    slop: { label: ['Slop, U'], value: problem.u, reason: [`${stacked} of all limits`] },
    siteSlop: {
      label: ['Slop on site, Us'],
      value: problem.us,
      reason: [`${stacked} of cutting and seating alone`],
    },
    stretch: { label: ['Stretch'], value: cut.stretch, reason: stretchReason },
    limit: { label: ['Take-up limit'], value: cut.limit, reason: takeUp },
    longest: { label: ['Longest path'], value: cut.longest, reason: [bound] },
  }
}

/** What is cut, and what of the take-up it uses. */
export function explainOutcome({ own, cut, problem, rules }: CutContext): WorkingLine[] {
  if (cut.mode === 'none') return []
  return cut.mode === 'shop' ? shopLines(cut, own, rules) : siteLines(cut, problem, rules)
}

function shopLines(cut: ShopCut, own: CutLength, rules: HouseRules): WorkingLine[] {
  const grouped = own.mode === 'shop' && own.cut !== cut.cut
  const reason: Phrase = grouped
    ? ['the longest cut of the run, which fits this cable too; its own would be ', { length: own.cut }]
    : ['the length that sits exactly and U, rounded up to ', { length: rules.cutStep }]
  return [
    { label: ['Cut length'], value: cut.cut, reason },
    { label: ['Slack'], value: cut.slack, reason: ['cut length less the length that sits exactly'] },
    { label: ['Planned take-up'], value: cut.planned, reason: ['slack and stretch'] },
    { label: ['Worst take-up'], value: cut.worst, reason: ['planned take-up and U'] },
    { label: ['Left of the limit'], value: cut.limit - cut.worst, reason: ['limit less worst take-up'] },
  ]
}

const siteLines = (cut: SiteCut, { u }: CutProblem, rules: HouseRules): WorkingLine[] => [
  {
    label: ['Cut length'],
    value: cut.cut,
    reason: [
      'the length that sits exactly, U of ',
      { length: u },
      ' and ',
      { length: rules.trim },
      ' to trim, rounded up to ',
      { length: rules.cutStep },
    ],
  },
  {
    label: ['Finish length'],
    value: cut.finish,
    reason: ['cut at the mark with the first end locked and the cable pulled hand-tight'],
  },
  { label: ['Planned take-up'], value: cut.planned, reason: ['stretch alone: the mark leaves no slack'] },
  { label: ['Worst take-up'], value: cut.worst, reason: ['planned take-up and Us'] },
  { label: ['Left of the limit'], value: cut.limit - cut.worst, reason: ['limit less worst take-up'] },
]

/** Why the cable is *shop*, *site* or *too long*. */
export function explainMode({ own, cut, problem, rules }: CutContext): Phrase {
  const limit = { length: cut.limit }
  if (cut.mode === 'none') {
    return [
      'Too long: the path of ',
      { length: problem.path },
      ' passes the longest, ',
      { length: cut.longest },
    ]
  }
  if (cut.mode === 'shop') {
    return [
      'Both ends in the shop: slack, U and stretch come to ',
      { length: cut.worst },
      ', within the limit of ',
      limit,
    ]
  }
  const asShop = roundUpToStep(own.base + problem.u, rules.cutStep) - own.base + problem.u + own.stretch
  return [
    'Finished on site: cut in the shop it could need ',
    { length: asShop },
    ', beyond the limit of ',
    limit,
  ]
}
