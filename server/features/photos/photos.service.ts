import { randomUUID } from 'node:crypto'
import type { PhotoRecord } from '@shared/schemas/survey-record'
import { type PhotoStorage, photoKey, type PictureSize } from '../../adapters/photo-storage'
import type { Database } from '../../database/client'
import { assertSurvey, holdSurvey, removedPhotos } from '../surveys/hold-survey.service'
import type { UploadedFile } from './inspect-photo'
import { nextPhotoId } from './next-photo-id'
import { photoName } from './photo-name'
import { toPhotoRecord } from './photo-records.service'
import { noSuchPhoto, tooManyPhotos } from './photos.errors'
import { insertPhoto, selectPhoto, selectSurveyPhotos } from './photos.queries'
import { type PreparedPhoto, preparePhoto } from './prepare-photo'
import { takeTurns } from './take-turns'

export interface PhotoDeps {
  database: Database
  photoStorage: PhotoStorage
}

interface NewPhoto {
  companyId: string
  surveyId: string
  file: UploadedFile
  /** Whether the company keeps where its photos were taken. */
  keepPlace: boolean
}

/** As many as a survey may hold. */
const MAX_PHOTOS = 100
/** Two pictures of 60 megapixels in memory at once are enough. */
const inTurn = takeTurns(2)

/**
 * Stores a photo of a survey: checks the file, makes picture and thumbnail, and gives it its id inside the survey.
 * Whatever fails on the way, neither row nor picture stays behind.
 */
export async function addPhoto(deps: PhotoDeps, photo: NewPhoto): Promise<PhotoRecord> {
  await assertSurvey(deps.database, photo)
  const prepared = await inTurn(() => preparePhoto(photo.file))
  const id = randomUUID()
  try {
    return await deps.database.transaction(async (transaction) => {
      const record = await insertRow(transaction, { id, photo, prepared })
      await deps.photoStorage.write(photoKey(photo.companyId, id, 'picture'), prepared.picture)
      await deps.photoStorage.write(photoKey(photo.companyId, id, 'thumbnail'), prepared.thumbnail)
      return record
    })
  } catch (error) {
    await Promise.allSettled(
      (['picture', 'thumbnail'] as const).map((size) =>
        deps.photoStorage.remove(photoKey(photo.companyId, id, size)),
      ),
    )
    throw error
  }
}

/** The survey is held, so that two photos sent at once get different ids. */
async function insertRow(
  transaction: Database,
  { id, photo, prepared }: { id: string; photo: NewPhoto; prepared: PreparedPhoto },
): Promise<PhotoRecord> {
  const survey = { companyId: photo.companyId, surveyId: photo.surveyId }
  const document = await holdSurvey(transaction, survey)
  const stored = await selectSurveyPhotos(transaction, survey)
  if (stored.length >= MAX_PHOTOS) {
    const removed = await removedPhotos(transaction, survey, document)
    const kept = stored.filter(({ surveyPhotoId }) => !removed.has(surveyPhotoId))
    if (kept.length >= MAX_PHOTOS) throw tooManyPhotos(MAX_PHOTOS)
  }
  const { takenAt, focalLength35, place } = prepared.details
  return toPhotoRecord(
    await insertPhoto(transaction, {
      ...survey,
      id,
      surveyPhotoId: nextPhotoId([
        ...document.photos.map((known) => known.id),
        ...stored.map(({ surveyPhotoId }) => surveyPhotoId),
      ]),
      name: photoName(photo.file.name),
      width: prepared.width,
      height: prepared.height,
      bytes: prepared.picture.length,
      takenAt,
      focalLength35,
      latitude: photo.keepPlace ? (place?.latitude ?? null) : null,
      longitude: photo.keepPlace ? (place?.longitude ?? null) : null,
    }),
  )
}

/** The bytes of a stored picture, for people of the company that owns it. */
export async function readPicture(
  deps: PhotoDeps,
  { companyId, photoId, size }: { companyId: string; photoId: string; size: PictureSize },
): Promise<Buffer> {
  if (!(await selectPhoto(deps.database, { companyId, id: photoId }))) throw noSuchPhoto()
  const bytes = await deps.photoStorage.read(photoKey(companyId, photoId, size))
  if (!bytes) throw noSuchPhoto()
  return bytes
}
