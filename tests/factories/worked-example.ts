import { readFileSync } from 'node:fs'
import { starterRules } from '@shared/calculation/starter-rules'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { readSurveyFile } from '@shared/schemas/survey-file'

/** The worked example of the product's first issue: posts softwood, softwood, hardwood; bays 46 1/2 / 46 1/4 and 44 1/8 in. */
export function workedExample(): CalculationInput {
  const path = new URL('../worked-examples/in/two-bays.json', import.meta.url)
  const { survey, hardware, rules } = readSurveyFile(JSON.parse(readFileSync(path, 'utf8')))
  if (!hardware) throw new Error('The worked example names its hardware.')
  return { survey, hardware, rules: rules ?? starterRules }
}
