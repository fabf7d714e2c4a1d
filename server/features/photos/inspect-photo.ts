import { type PictureKind, readMakeUp, recognisePicture } from './recognise-picture'
import { kindRefusal, refusal } from './refusals'
import { hasSecondContent } from './second-content'

export interface UploadedFile {
  bytes: Uint8Array
  /** As the sender named it. */
  name: string
  /** As the sender declared it. */
  mediaType: string
}

const extensions: Record<string, PictureKind> = {
  jpg: 'jpeg',
  jpeg: 'jpeg',
  jpe: 'jpeg',
  png: 'png',
  webp: 'webp',
}
const mediaTypes: Record<string, PictureKind> = {
  'image/jpeg': 'jpeg',
  'image/jpg': 'jpeg',
  'image/png': 'png',
  'image/webp': 'webp',
}

/**
 * Decides by content whether a file may be decoded as a photo, without decoding it. A name or type that claims
 * another kind of picture than the content is refused; one that claims nothing (`photo`, octet stream) is not.
 * @throws PhotoRefusal
 */
export function inspectPhoto({ bytes, name, mediaType }: UploadedFile): 'jpeg' | 'png' | 'webp' {
  if (bytes.length === 0) throw refusal('photo-empty')
  const kind = recognisePicture(bytes)
  if (kind === 'heic') throw refusal('photo-heic')
  if (kind === 'none') throw refusal('photo-kind')
  if (kind !== 'jpeg' && kind !== 'png' && kind !== 'webp') throw kindRefusal(kind)
  const claims = [extensions[extensionOf(name)], mediaTypes[mediaType.toLowerCase()]]
  if (claims.some((claim) => claim !== undefined && claim !== kind)) throw refusal('photo-mislabelled')
  const { end, animated } = readMakeUp(bytes, kind)
  if (animated) throw refusal('photo-animated')
  if (end === undefined) throw refusal('photo-broken')
  if (hasSecondContent(bytes, kind, end)) throw refusal('photo-two-kinds')
  return kind
}

const extensionOf = (name: string): string => /\.([a-z0-9]+)$/i.exec(name)?.[1]?.toLowerCase() ?? ''
