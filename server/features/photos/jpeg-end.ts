const SOI = 0xd8
const EOI = 0xd9
const SOS = 0xda

/** Markers that stand alone: TEM, RST0 to RST7, SOI. */
const standsAlone = (marker: number): boolean =>
  marker === 0x01 || (marker >= 0xd0 && marker <= 0xd7) || marker === SOI

/**
 * Where the first picture of a JPEG stream ends: the offset after its end marker (ITU-T T.81, annex B), or undefined
 * where the stream breaks off or is none. Walks the segments, so a thumbnail inside one is not taken for the picture.
 */
export function jpegEnd(bytes: Uint8Array): number | undefined {
  if (bytes[0] !== 0xff || bytes[1] !== SOI) return undefined
  let at = 2
  while (at + 1 < bytes.length) {
    if (bytes[at] !== 0xff) return undefined
    const marker = bytes[at + 1] ?? 0
    if (marker === 0xff) at += 1
    else if (marker === EOI) return at + 2
    else if (standsAlone(marker)) at += 2
    else {
      const next = at + 2 + segmentLength(bytes, at + 2)
      at = marker === SOS ? endOfScan(bytes, next) : next
    }
  }
  return undefined
}

const segmentLength = (bytes: Uint8Array, at: number): number =>
  Math.max(2, ((bytes[at] ?? 0) << 8) | (bytes[at + 1] ?? 0))

/** Skips entropy-coded data: a 0xFF in it is followed by 0x00 or a restart marker. */
function endOfScan(bytes: Uint8Array, from: number): number {
  let at = from
  while (at + 1 < bytes.length) {
    const marker = bytes[at + 1] ?? 0
    if (bytes[at] === 0xff && marker !== 0x00 && marker !== 0xff && !(marker >= 0xd0 && marker <= 0xd7)) {
      return at
    }
    at += 1
  }
  return bytes.length
}
