import { writeSurveyFile } from '@shared/schemas/survey-file'
import type { SurveyRecord } from '@shared/schemas/survey-record'
import type { Database } from '../../database/client'
import { ownGuardRules } from '../guard-rules/guard-rules.service'
import { hardwareFor } from '../hardware/hardware.service'
import { readHouseRules } from '../house-rules/house-rules.service'
import type { SurveyKey } from './surveys.queries'
import { readSurvey } from './surveys.service'

/** What is calculated from: a survey, the hardware it may use, the company's rules and own guard rules it names. */
export async function readCalculationInput(database: Database, key: SurveyKey) {
  const record = await readSurvey(database, key)
  const used = new Set(record.survey.runs.map(({ cable }) => cable))
  const [hardware, rules, own] = await Promise.all([
    hardwareFor({ database, companyId: key.companyId }, used),
    readHouseRules(database, key.companyId),
    ownGuardRules({ database, companyId: key.companyId }),
  ])
  const named = own.filter(({ id }) => id === record.survey.guard.rules)
  const guardRules = named.length > 0 ? named : undefined
  return { record, input: { survey: record.survey, hardware, rules, guardRules } }
}

/** The survey file, in the survey's units, with all that its cut list depends on. */
export async function exportSurveyFile(
  database: Database,
  key: SurveyKey,
): Promise<{ record: SurveyRecord; file: unknown }> {
  const { record, input } = await readCalculationInput(database, key)
  return { record, file: writeSurveyFile(input) }
}
