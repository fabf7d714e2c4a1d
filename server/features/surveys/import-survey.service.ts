import { randomUUID } from 'node:crypto'
import type { Survey } from '@shared/schemas/survey'
import type { SurveyRecord } from '@shared/schemas/survey-record'
import type { Database } from '../../database/client'
import { ownGuardRules } from '../guard-rules/guard-rules.service'
import { listHardware } from '../hardware/hardware.service'
import { readHouseRules } from '../house-rules/house-rules.service'
import { importNotes } from './import-notes'
import { readImport } from './read-import'
import { surveyAsOperations } from './survey-as-operations'
import { digest } from './survey-document'
import { noSuchJob } from './surveys.errors'
import { insertChanges, insertSurvey, jobExists, updateSurvey } from './surveys.queries'
import { readSurvey } from './surveys.service'

export interface ImportRequest {
  companyId: string
  jobId: string
  person: { id: string; name: string }
  /** The parsed survey file. */
  input: unknown
  now: Date
}

/**
 * Begins a survey from a survey file. Everything is checked before anything is written; what is not taken over
 * (hardware, rules, pictures and overruled stops) is said in notes. Readings keep who and when the file names: it is a record made
 * elsewhere, and the history says who brought it in.
 */
export async function importSurvey(
  database: Database,
  request: ImportRequest,
): Promise<{ survey: SurveyRecord; notes: string[] }> {
  const { companyId, jobId, input } = request
  if (!(await jobExists(database, { companyId, jobId }))) throw noSuchJob()
  const { cables, fittings } = await listHardware({ database, companyId })
  const hardware = {
    cables: cables.map(({ cable }) => cable),
    fittings: fittings.map(({ fitting }) => fitting),
  }
  const file = readImport(input, new Set(hardware.cables.map(({ id }) => id)))
  const notes = importNotes(file, {
    hardware,
    rules: await readHouseRules(database, companyId),
    guardRules: await ownGuardRules({ database, companyId }),
  })
  const surveyId = await write(database, request, { ...file.survey, photos: [], overruled: [] })
  return { survey: await readSurvey(database, { companyId, surveyId }), notes }
}

/** The survey at once, with the history of operations that make it. */
async function write(
  database: Database,
  { companyId, jobId, person, now }: ImportRequest,
  survey: Survey,
): Promise<string> {
  return database.transaction(async (transaction) => {
    const surveyId = await insertSurvey(transaction, { companyId, jobId, ...digest(survey) })
    const steps = surveyAsOperations(survey)
    await updateSurvey(transaction, { companyId, surveyId }, { revision: steps.length })
    await insertChanges(
      transaction,
      steps.map((operation, i) => ({
        companyId,
        surveyId,
        revision: i + 1,
        changeId: randomUUID(),
        operation,
        personId: person.id,
        personName: person.name,
        at: now,
      })),
    )
    return surveyId
  })
}
