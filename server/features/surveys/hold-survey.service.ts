import type { Survey } from '@shared/schemas/survey'
import type { Database } from '../../database/client'
import { readDocument } from './survey-document'
import { noSuchSurvey } from './surveys.errors'
import { lockSurvey, selectSurvey, type SurveyKey } from './surveys.queries'

/** The survey, held until the transaction ends. @throws when there is none. */
export async function holdSurvey(transaction: Database, key: SurveyKey): Promise<Survey> {
  const row = await lockSurvey(transaction, key)
  if (!row) throw noSuchSurvey()
  return readDocument(row.document)
}

/** @throws when there is no such survey, before anything costly is begun for it. */
export async function assertSurvey(database: Database, key: SurveyKey): Promise<void> {
  if (!(await selectSurvey(database, key))) throw noSuchSurvey()
}
