import type { Survey } from '@shared/schemas/survey'
import type { Database } from '../../database/client'
import { readDocument } from './survey-document'
import { noSuchSurvey } from './surveys.errors'
import { lockSurvey, selectRemovedPhotoIds, selectSurvey, type SurveyKey } from './surveys.queries'

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

/** The photos that were part of a survey and no longer are. Those of which it has not heard yet are none of them. */
export async function removedPhotos(
  database: Database,
  key: SurveyKey,
  { photos }: Pick<Survey, 'photos'>,
): Promise<Set<string>> {
  const removed = new Set(await selectRemovedPhotoIds(database, key))
  for (const { id } of photos) removed.delete(id)
  return removed
}
