import { surveys } from '@shared/endpoints/surveys'
import type { Problem } from '@shared/schemas/problem'
import type { PhotoRecord } from '@shared/schemas/survey-record'
import { csrfHeader } from '@/lib/api-client'
import { ApiError, offline, unreadable } from '@/lib/api-error'

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
      const answer = request.response as PhotoRecord | Problem | null
      // Not JSON: a public network's own page, or a proxy's, whatever its status says.
      if (answer === null || typeof answer !== 'object') return reject(unreadable())
      if (request.status < 400) return resolve(answer as PhotoRecord)
      const { code, detail } = answer as Problem
      reject(new ApiError(code, request.status, detail))
    }
    request.send(form)
  })
}

const photoAddress = (path: string, photoId: string): string =>
  path.replace(':photoId', encodeURIComponent(photoId))
export const pictureAddress = (photoId: string): string => photoAddress(surveys.readPicture.path, photoId)
export const thumbnailAddress = (photoId: string): string => photoAddress(surveys.readThumbnail.path, photoId)
