import { and, asc, eq } from 'drizzle-orm'
import type { Database } from '../../database/client'
import { photos } from '../../database/tables/photos'

export type PhotoRow = typeof photos.$inferSelect
export type NewPhoto = typeof photos.$inferInsert

export const selectSurveyPhotos = (
  database: Database,
  survey: { companyId: string; surveyId: string },
): Promise<PhotoRow[]> =>
  database
    .select()
    .from(photos)
    .where(and(eq(photos.companyId, survey.companyId), eq(photos.surveyId, survey.surveyId)))
    .orderBy(asc(photos.createdAt), asc(photos.surveyPhotoId))

export async function selectPhoto(
  database: Database,
  photo: { companyId: string; id: string },
): Promise<PhotoRow | undefined> {
  const [row] = await database
    .select()
    .from(photos)
    .where(and(eq(photos.companyId, photo.companyId), eq(photos.id, photo.id)))
  return row
}

export async function insertPhoto(database: Database, photo: NewPhoto): Promise<PhotoRow> {
  const [row] = await database.insert(photos).values(photo).returning()
  if (!row) throw new Error('A photo was inserted and no row came back.')
  return row
}
