import type { Database } from '../../server/database/client'
import { photos } from '../../server/database/tables/photos'
import type { SurveyRow } from './survey-record'

export type PhotoRow = typeof photos.$inferSelect

/** A photo’s row; its picture is wherever the test puts one. */
export async function createPhotoRow(
  database: Database,
  survey: Pick<SurveyRow, 'companyId' | 'id'>,
  given: Partial<typeof photos.$inferInsert> = {},
): Promise<PhotoRow> {
  const [row] = await database
    .insert(photos)
    .values({
      companyId: survey.companyId,
      surveyId: survey.id,
      surveyPhotoId: 'F1',
      name: 'deck.jpg',
      width: 64,
      height: 48,
      bytes: 900,
      ...given,
    })
    .returning()
  return row!
}
