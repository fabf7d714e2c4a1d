import type { Hardware } from '@shared/schemas/hardware'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { Survey } from '@shared/schemas/survey'
import { longestRun } from '@shared/survey/longest-run'
import { proposeRuns } from '@shared/survey/propose-runs'
import type { SurveyOperation } from '@shared/survey/survey-operation'

/** Runs as this company would lay them: with its cable, its longest run and its largest bend. */
export const proposeRunsOf =
  ({ hardware, rules }: { hardware: Hardware; rules: HouseRules }) =>
  (survey: Survey): SurveyOperation[] => {
    const cable = survey.runs[0]?.cable ?? hardware.cables[0]?.id
    if (cable === undefined) return []
    return proposeRuns(survey, {
      cable,
      maxBend: rules.maxBend,
      longestRun: longestRun(hardware, rules, cable),
    })
  }
