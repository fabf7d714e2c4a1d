import exifr from 'exifr'
import { z } from 'zod'

export interface PhotoDetails {
  /** `2026-05-14T09:42:17`, with the offset from UTC where the camera wrote one. */
  takenAt: string | null
  /** Focal length as on 35 mm film, in millimetres. */
  focalLength35: number | null
  place: { latitude: number; longitude: number } | null
}

/** What a camera may have written; anything else counts as not written. */
const tagsSchema = z.object({
  DateTimeOriginal: z.string().optional().catch(undefined),
  OffsetTimeOriginal: z.string().optional().catch(undefined),
  FocalLengthIn35mmFormat: z.number().min(1).max(5000).optional().catch(undefined),
  latitude: z.number().min(-90).max(90).optional().catch(undefined),
  longitude: z.number().min(-180).max(180).optional().catch(undefined),
})

const nothing: PhotoDetails = { takenAt: null, focalLength35: null, place: null }

/** Reads when and how a photo was taken. Missing or damaged details are no reason to refuse a photo. */
export async function readPhotoDetails(bytes: Buffer): Promise<PhotoDetails> {
  const found: unknown = await exifr
    .parse(bytes, {
      tiff: true,
      exif: true,
      gps: true,
      xmp: false,
      icc: false,
      iptc: false,
      jfif: false,
      reviveValues: false,
    })
    .catch(() => undefined)
  const tags = tagsSchema.safeParse(found)
  if (!tags.success) return nothing
  const { DateTimeOriginal, OffsetTimeOriginal, FocalLengthIn35mmFormat, latitude, longitude } = tags.data
  return {
    takenAt: DateTimeOriginal ? isoTime(DateTimeOriginal, OffsetTimeOriginal) : null,
    focalLength35: FocalLengthIn35mmFormat ?? null,
    place: latitude === undefined || longitude === undefined ? null : { latitude, longitude },
  }
}

const isoDateTime = z.iso.datetime({ local: true, offset: true })

/** `2026:05:14 09:42:17` as a camera writes it (EXIF 2.3, tag 0x9003), to ISO 8601; null when it is no time. */
function isoTime(written: string, offset = ''): string | null {
  const match = /^(\d{4}):(\d\d):(\d\d) (\d\d:\d\d:\d\d)/.exec(written)
  if (!match) return null
  const zone = /^[+-]\d\d:\d\d$/.test(offset) ? offset : ''
  const parsed = isoDateTime.safeParse(`${match[1]}-${match[2]}-${match[3]}T${match[4]}${zone}`)
  return parsed.success ? parsed.data : null
}
