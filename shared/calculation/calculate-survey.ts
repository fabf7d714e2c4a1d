import { calculateRun } from './calculate-run'
import { bayFindings } from './findings/reading-findings'
import { toFinding } from './findings/notice'
import { once } from './findings/once'
import type { SurveyResult } from './result'
import { type CalculationInput, indexSurvey } from './survey-index'

/**
 * From a measured survey to its cut list: sections 1 to 7 of the calculation.
 *
 * Each bay's readings are averaged and judged; each run is laid out, its cables get their heights, its ends their
 * fittings; each cable gets its path, its slop, and a length with the place where it is to be crimped.
 * Units: nm and N. Nothing is rounded but heights (`holeStep`) and cut lengths (`cutStep`).
 *
 * @example two bays of 46 1/2 and 44 1/8 in: eleven cables, each with a cut length near 95 3/4 in
 */
export function calculateSurvey(input: CalculationInput): SurveyResult {
  const index = indexSurvey(input)
  const { bays, runs, units } = input.survey
  const ofBays = bays.flatMap((bay) =>
    bayFindings(bay, input.rules).map((notice) => toFinding(notice, units)),
  )
  const calculated = runs.map((run) => calculateRun(index, run))
  return {
    runs: calculated.map(({ result }) => result),
    cables: calculated.flatMap(({ result }) => result.cables),
    findings: once([...ofBays, ...calculated.flatMap(({ findings }) => findings)]),
  }
}
