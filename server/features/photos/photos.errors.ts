import { AppError, notFound } from '../../errors'

export const noSuchPhoto = () => notFound('photo')

export const tooManyPhotos = (most: number) =>
  new AppError(
    409,
    'photo-too-many',
    `This survey has ${most} photos, which is all it can hold. Begin another survey in the job for more.`,
  )

export const photoTooLarge = () =>
  new AppError(
    413,
    'photo-too-large',
    'The photo is larger than 25 MB. Set the camera to a smaller picture size, or save a smaller copy, and send that.',
  )

export const photoMissing = () =>
  new AppError(422, 'photo-missing', 'No photo arrived. Choose one photo and send it in the field “photo”.', {
    fields: [{ path: 'photo', message: 'Choose one photo.' }],
  })

/** The request itself was not put together as it should be: cut off, or with more than one file. */
export const uploadBroken = (log: string) =>
  new AppError(400, 'upload-broken', 'The upload was cut off or holds more than one photo. Send it again.', {
    log,
  })
