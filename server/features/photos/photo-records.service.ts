import type { PhotoRecord } from '@shared/schemas/survey-record'
import type { Database } from '../../database/client'
import { type PhotoRow, selectSurveyPhotos } from './photos.queries'

/** The stored photos of a survey, in the order they came. */
export async function listPhotos(
  database: Database,
  survey: { companyId: string; surveyId: string },
): Promise<PhotoRecord[]> {
  return (await selectSurveyPhotos(database, survey)).map(toPhotoRecord)
}

export const toPhotoRecord = ({
  id,
  surveyPhotoId,
  name,
  width,
  height,
  bytes,
  takenAt,
  focalLength35,
  latitude,
  longitude,
}: PhotoRow): PhotoRecord => ({
  id,
  surveyPhotoId,
  name,
  width,
  height,
  bytes,
  takenAt,
  focalLength35,
  place: latitude === null || longitude === null ? null : { latitude, longitude },
})
