import { AppError } from '../../errors'

export type PhotoRefusalCode =
  | 'photo-empty'
  | 'photo-heic'
  | 'photo-kind'
  | 'photo-mislabelled'
  | 'photo-animated'
  | 'photo-broken'
  | 'photo-too-many-pixels'
  | 'photo-two-kinds'

/** Why a file is not taken as a photo: 415 where the kind of file is the matter, 422 where this one is. */
export class PhotoRefusal extends AppError {
  constructor(code: PhotoRefusalCode, sentence: string) {
    const kind = code === 'photo-heic' || code === 'photo-kind' || code === 'photo-mislabelled'
    super(kind ? 415 : 422, code, sentence)
    this.name = 'PhotoRefusal'
  }
}

const SEND_INSTEAD = 'Send a JPEG, PNG or WebP picture.'
const CAMERA_JPEG =
  'On the phone, open the camera’s settings, choose Formats and then Most compatible (or JPEG) and take it again, or share the photo as JPEG and send that.'

const sentences: Record<PhotoRefusalCode, string> = {
  'photo-empty': `The file is empty. ${SEND_INSTEAD}`,
  'photo-heic': `This photo is in the HEIC format, which browsers do not all show. ${CAMERA_JPEG}`,
  'photo-kind': `The file is not a photo that can be used here. ${SEND_INSTEAD}`,
  'photo-mislabelled':
    'The file’s name says one kind of picture and its content is another. Save the photo again as JPEG and send that.',
  'photo-animated': 'The file is a moving picture. Send a still photo as JPEG, PNG or WebP.',
  'photo-broken':
    'The photo is broken or was cut off on the way. Open it on the phone to see that it is whole, then send it again.',
  'photo-too-many-pixels':
    'The photo has more than 60 megapixels. Set the camera to a smaller picture size, or save a smaller copy, and send that.',
  'photo-two-kinds':
    'The file is a picture with something else attached to it. Save the photo again as JPEG and send that.',
}

export const refusal = (code: PhotoRefusalCode): PhotoRefusal => new PhotoRefusal(code, sentences[code])

const foreignKinds = { avif: 'an AVIF', gif: 'a GIF', tiff: 'a TIFF', svg: 'an SVG' } as const

/** For a file that is recognised but not taken. */
export const kindRefusal = (kind: keyof typeof foreignKinds): PhotoRefusal =>
  new PhotoRefusal('photo-kind', `The file is ${foreignKinds[kind]} picture. ${SEND_INSTEAD}`)
