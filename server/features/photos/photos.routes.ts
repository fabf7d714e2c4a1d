import type { RequestHandler, Response, Router } from 'express'
import multer, { memoryStorage, MulterError } from 'multer'
import { surveys } from '@shared/endpoints/surveys'
import type { PictureSize } from '../../adapters/photo-storage'
import { type Call, route } from '../../http/route'
import type { Services } from '../../services'
import { photoMissing, photoTooLarge, uploadBroken } from './photos.errors'
import { addPhoto, readPicture } from './photos.service'
import { MAX_BYTES } from './prepare-photo'

/** In memory, so that nothing lies about on disk whatever becomes of the upload. */
const upload = multer({
  storage: memoryStorage(),
  // Browsers write names in UTF-8.
  defParamCharset: 'utf8',
  limits: { fileSize: MAX_BYTES, files: 1, fields: 4, parts: 6, fieldSize: 1000, headerPairs: 50 },
}).single('photo')

const receivePhoto: RequestHandler = (request, response, next) => {
  upload(request, response, (error: unknown) => {
    if (error === undefined || error === null) return next()
    if (error instanceof MulterError && error.code === 'LIMIT_FILE_SIZE') return next(photoTooLarge())
    next(uploadBroken(error instanceof Error ? error.message : 'not an error'))
  })
}

export function photosRoutes(router: Router, services: Services): void {
  const at = { router, services }
  route(
    at,
    surveys.addPhoto,
    ({ params, person, request }) => {
      const { file } = request
      if (!file) throw photoMissing()
      return addPhoto(services, {
        companyId: person.companyId,
        surveyId: params.surveyId,
        file: { bytes: file.buffer, name: file.originalname, mediaType: file.mimetype },
        keepPlace: person.company.keepPhotoPlace,
      })
    },
    [receivePhoto],
  )
  route(at, surveys.readPicture, (call) => sendPicture(call, 'picture'))
  route(at, surveys.readThumbnail, (call) => sendPicture(call, 'thumbnail'))
}

type PictureCall = Call<{ photoId: string }, undefined, undefined>

async function sendPicture({ services, companyId, params, response }: PictureCall, size: PictureSize) {
  const bytes = await readPicture(services, { companyId, photoId: params.photoId, size })
  keepForever(response)
  response.type('image/jpeg').send(bytes)
  return undefined
}

/** A stored picture never changes. It belongs to one company, so that only the person’s own browser may keep it. */
const keepForever = (response: Response): Response =>
  response.set({
    'Cache-Control': 'private, max-age=31536000, immutable',
    'X-Content-Type-Options': 'nosniff',
  })
