import sharp, { type Metadata, type Sharp } from 'sharp'
import { inspectPhoto, type UploadedFile } from './inspect-photo'
import { type PhotoDetails, readPhotoDetails } from './photo-details'
import type { PhotoRefusal } from './refusals'
import { refusal } from './refusals'

export const MAX_BYTES = 25 * 1024 * 1024
const MAX_PIXELS = 60_000_000
const PICTURE_SIDE = 2560
const THUMBNAIL_SIDE = 480
/** Longest that one picture may take; a file made to be slow is refused as broken. */
const SECONDS = 30

export interface PreparedPhoto {
  picture: Buffer
  thumbnail: Buffer
  width: number
  height: number
  details: PhotoDetails
}

/**
 * Makes what is stored of an uploaded file: an upright JPEG of at most 2560 px and a thumbnail, both made anew from
 * the pixels, so that nothing else of the file is kept.
 * @throws PhotoRefusal
 */
export async function preparePhoto(file: UploadedFile): Promise<PreparedPhoto> {
  inspectPhoto(file)
  const bytes = Buffer.from(file.bytes.buffer, file.bytes.byteOffset, file.bytes.byteLength)
  await checkSize(bytes)
  const details = await readPhotoDetails(bytes)
  try {
    const { data: picture, info } = await shrink(open(bytes).autoOrient(), PICTURE_SIDE, 82)
    const { data: thumbnail } = await shrink(open(picture), THUMBNAIL_SIDE, 78)
    return { picture, thumbnail, width: info.width, height: info.height, details }
  } catch (error) {
    throw broken(error)
  }
}

/** Reads the size from the header alone, before anything is decoded. */
async function checkSize(bytes: Buffer): Promise<void> {
  const { width, height, pages } = await sharp(bytes, { limitInputPixels: false })
    .metadata()
    .catch((error: unknown): Metadata => {
      throw broken(error)
    })
  if (width * height > MAX_PIXELS) throw refusal('photo-too-many-pixels')
  if ((pages ?? 1) > 1) throw refusal('photo-animated')
}

const open = (bytes: Buffer): Sharp =>
  sharp(bytes, { limitInputPixels: MAX_PIXELS, failOn: 'error', sequentialRead: true }).timeout({
    seconds: SECONDS,
  })

const shrink = (image: Sharp, side: number, quality: number) =>
  image
    .resize({ width: side, height: side, fit: 'inside', withoutEnlargement: true })
    .flatten({ background: 'white' })
    .toColourspace('srgb')
    .jpeg({ quality, progressive: true })
    .toBuffer({ resolveWithObject: true })

const broken = (error: unknown): PhotoRefusal => Object.assign(refusal('photo-broken'), { cause: error })
