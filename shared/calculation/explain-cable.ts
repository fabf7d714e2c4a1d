import type { HouseRules } from '../schemas/house-rules'
import { cableResult } from './calculate-run'
import { layOutRun } from './course'
import { type CutContext, explainFigures, explainMode, explainOutcome } from './explain-cut'
import { explainEnds } from './explain-ends'
import { explainPath, explainPathLimits } from './explain-path'
import { type CableFigures, figureRun, type RunFigures } from './figure-run'
import type { Phrase } from './phrase'
import type { WhyNone } from './result'
import { type CalculationInput, indexSurvey } from './survey-index'
import type { CableWorking, LimitLine, WorkingLine } from './working'

/**
 * The working of one cable: every figure from its readings to its cut length, each with its reason. Worked out anew
 * for the one cable, so that the survey's result stays light.
 *
 * @returns undefined when there is no such run or cable
 */
export function explainCable(
  input: CalculationInput,
  { run: runId, cable: number }: { run: string; cable: number },
): CableWorking | undefined {
  const index = indexSurvey(input)
  const run = input.survey.runs.find(({ id }) => id === runId)
  const course = run && layOutRun(index, run)
  const figures = course && figureRun(index, course)
  const cable = figures?.cables[number - 1]
  if (!figures || !cable) return undefined
  const context = cutContext(figures, cable, input.rules)
  const { path } = cable
  return {
    run: runId,
    cable: number,
    result: cableResult(figures, cable),
    height: explainHeight(figures, cable, input.rules),
    path: path ? explainPath(path, cable.height) : [],
    ...(path
      ? { pathTotal: { label: ['Path'], value: path.length, reason: ['from end face to end face'] } }
      : {}),
    ends: explainEnds(figures.ends),
    limits: path ? [...explainPathLimits(path), ...benchLines(input.rules)] : [],
    ...(context ? explainFigures(context) : {}),
    outcome: context ? explainOutcome(context) : [],
    mode: context ? explainMode(context) : noLength(cable.why),
  }
}

function cutContext({ course }: RunFigures, cable: CableFigures, rules: HouseRules): CutContext | undefined {
  const { problem, own, cut } = cable
  return problem && own && cut ? { course, problem, own, cut, rules } : undefined
}

function explainHeight(
  { course, opening, heights }: RunFigures,
  cable: CableFigures,
  rules: HouseRules,
): WorkingLine {
  const label = ['Height of the hole’s centre']
  const layout = course.run.cables
  if ('heights' in layout) return { label, value: cable.height, reason: ['as given for this run'] }
  const count = heights.heights.length
  const reason: Phrase = [
    `cable ${cable.number} of ${count} between `,
    { length: opening.bottom },
    ' and ',
    { length: opening.top },
    layout.layout === 'even'
      ? `, in ${count + 1} equal openings of no more than `
      : ', down from the rail by ',
    { length: heights.pitch ?? layout.spacing },
    ', rounded to ',
    { length: rules.holeStep },
  ]
  return { label, value: cable.height, reason }
}

function benchLines({ cutLimit, seatLimit }: HouseRules): LimitLine[] {
  const seat = (end: string): LimitLine => ({
    kind: 'seat',
    label: [`Seat at the ${end} end`],
    value: seatLimit,
    reason: ['the house’s limit of seating and crimping an end'],
    onSite: true,
  })
  const reason = ['the house’s limit of cutting']
  return [
    { kind: 'cut', label: ['Cut'], value: cutLimit, reason, onSite: true },
    seat('first'),
    seat('other'),
  ]
}

function noLength(why: WhyNone | undefined): Phrase {
  if (why === 'no-fitting') return ['No length: no fitting suits one of the ends']
  return ['No length: a reading is missing or cannot be right']
}
