import { jpegEnd } from './jpeg-end'

/** What a file is by its content; its name and declared type play no part. */
export type PictureKind = 'jpeg' | 'png' | 'webp' | 'heic' | 'avif' | 'gif' | 'tiff' | 'svg' | 'none'

const text = (bytes: Uint8Array, from: number, to: number): string =>
  Buffer.from(bytes.subarray(from, to)).toString('latin1')

const PNG_SIGNATURE = '\x89PNG\r\n\x1a\n'
/** Major brands of HEIF pictures (ISO/IEC 23008-12, registered brands). */
const heifBrands = ['heic', 'heix', 'heim', 'heis', 'hevc', 'hevx', 'mif1', 'msf1']

export function recognisePicture(bytes: Uint8Array): PictureKind {
  if (bytes[0] === 0xff && bytes[1] === 0xd8 && bytes[2] === 0xff) return 'jpeg'
  if (text(bytes, 0, 8) === PNG_SIGNATURE) return 'png'
  if (text(bytes, 0, 4) === 'RIFF' && text(bytes, 8, 12) === 'WEBP') return 'webp'
  if (text(bytes, 4, 8) === 'ftyp') return boxKind(bytes)
  if (text(bytes, 0, 4) === 'GIF8') return 'gif'
  if (['II*\0', 'MM\0*'].includes(text(bytes, 0, 4))) return 'tiff'
  return /<svg[\s>]/i.test(text(bytes, 0, 4096).replaceAll('\0', '')) ? 'svg' : 'none'
}

/** `mif1` is shared by HEIC and AVIF: the brands that follow decide. */
function boxKind(bytes: Uint8Array): PictureKind {
  const length = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength).getUint32(0)
  const brands = text(bytes, 8, Math.min(length, 128))
  if (/avif|avis/.test(brands)) return 'avif'
  return heifBrands.some((brand) => brands.includes(brand)) ? 'heic' : 'none'
}

/** How a picture's bytes are put together, as far as it can be told without decoding. */
export interface PictureMakeUp {
  /** Offset after the picture's last byte; undefined where the file breaks off. */
  end: number | undefined
  animated: boolean
}

export function readMakeUp(bytes: Uint8Array, kind: 'jpeg' | 'png' | 'webp'): PictureMakeUp {
  if (kind === 'jpeg') return { end: jpegEnd(bytes), animated: false }
  return kind === 'png' ? pngMakeUp(bytes) : webpMakeUp(bytes)
}

/** Walks the chunks to `IEND` (PNG, W3C, 5.3); `acTL` says that it moves. */
function pngMakeUp(bytes: Uint8Array): PictureMakeUp {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  let animated = false
  for (let at = 8; at + 12 <= bytes.length;) {
    const name = text(bytes, at + 4, at + 8)
    const next = at + 12 + view.getUint32(at)
    if (next > bytes.length) break
    if (name === 'IEND') return { end: next, animated }
    animated ||= name === 'acTL'
    at = next
  }
  return { end: undefined, animated }
}

/** The RIFF header states the length (WebP container); bit 1 of `VP8X` says that it moves. */
function webpMakeUp(bytes: Uint8Array): PictureMakeUp {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  const end = bytes.length >= 12 ? 8 + view.getUint32(4, true) : Infinity
  const animated = text(bytes, 12, 16) === 'VP8X' && ((bytes[20] ?? 0) & 0b10) !== 0
  return { end: end + (end % 2) <= bytes.length || end === bytes.length ? end : undefined, animated }
}
