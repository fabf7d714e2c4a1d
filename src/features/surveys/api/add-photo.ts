import { surveys } from '@shared/endpoints/surveys'
import type { Problem } from '@shared/schemas/problem'
import type { PhotoRecord } from '@shared/schemas/survey-record'
import { csrfHeader } from '@/lib/api-client'
import { ApiError, offline } from '@/lib/api-error'

/** Uploads a photo; `onProgress` is told the share sent. fetch cannot tell it, so this one request is an XMLHttpRequest. */
export async function addPhoto(
  surveyId: string,
  file: Blob & { name?: string },
  onProgress: (share: number) => void,
): Promise<PhotoRecord> {
  const form = new FormData()
  form.set('photo', file, file.name ?? 'photo.jpg')
  const [name, token] = await csrfHeader()
  return new Promise((resolve, reject) => {
    const request = new XMLHttpRequest()
    request.open(
      surveys.addPhoto.method,
      surveys.addPhoto.path.replace(':surveyId', encodeURIComponent(surveyId)),
    )
    request.setRequestHeader(name, token)
    request.responseType = 'json'
    request.upload.onprogress = ({ loaded, total }) => onProgress(total > 0 ? loaded / total : 0)
    request.onerror = () => reject(offline())
    request.onload = () => {
      if (request.status < 400) return resolve(request.response as PhotoRecord)
      const problem = request.response as Problem | null
      reject(
        new ApiError(
          problem?.code ?? 'failed',
          request.status,
          problem?.detail ?? 'The photo could not be stored. Try again.',
        ),
      )
    }
    request.send(form)
  })
}

const photoAddress = (path: string, photoId: string): string =>
  path.replace(':photoId', encodeURIComponent(photoId))
export const pictureAddress = (photoId: string): string => photoAddress(surveys.readPicture.path, photoId)
export const thumbnailAddress = (photoId: string): string => photoAddress(surveys.readThumbnail.path, photoId)
