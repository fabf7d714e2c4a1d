import type { PictureKind } from './recognise-picture'

/**
 * Whether a picture carries something that is not a picture: a file that reads as two kinds is not a photo anybody
 * took. Phones do append to a JPEG: further pictures, a short film, the maker's index, filler; those are let
 * through, since the stored picture is made anew and holds none of it.
 */
export function hasSecondContent(bytes: Uint8Array, kind: PictureKind, end: number): boolean {
  const file = Buffer.from(bytes.buffer, bytes.byteOffset, bytes.byteLength)
  if (isArchive(file) || isDocument(file)) return true
  const rest = file.subarray(end)
  if (isFiller(rest)) return false
  return kind === 'jpeg' ? !isPhoneTrailer(rest) : true
}

/** Looks for the end record of an archive (ZIP, APPNOTE 4.3.16), which may have a comment of 65 535 bytes after it. */
function isArchive(file: Buffer): boolean {
  const tail = file.subarray(Math.max(0, file.length - 65_557))
  const record = tail.lastIndexOf('PK\x05\x06', undefined, 'latin1')
  // One disk, numbered 0 twice: picture data that happens to hold the four letters does not go on like that.
  return record >= 0 && record + 8 <= tail.length && tail.readUInt32LE(record + 4) === 0
}

/** Document readers accept their header within the first 1024 bytes; browsers sniff for markup there. */
function isDocument(file: Buffer): boolean {
  const head = file.subarray(0, 1024).toString('latin1')
  return head.includes('%PDF-') || /<(html|script|svg|iframe|!doctype)|<\?php/i.test(head)
}

const isFiller = (rest: Buffer): boolean => rest.every((byte) => byte === 0x00 || byte === 0xff)

function isPhoneTrailer(rest: Buffer): boolean {
  const start = rest.findIndex((byte) => byte !== 0)
  const furtherPicture = rest[start] === 0xff && rest[start + 1] === 0xd8
  // A film begins with a box: its length, whose first bytes are zero, then its kind (ISO/IEC 14496-12).
  const film = rest.subarray(start, start + 8).includes('ftyp', 0, 'latin1')
  const makersIndex = rest.subarray(-4).toString('latin1') === 'SEFT'
  return furtherPicture || film || makersIndex
}
