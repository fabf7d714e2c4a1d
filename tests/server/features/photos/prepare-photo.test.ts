import { readFileSync } from 'node:fs'
import exifr from 'exifr'
import sharp from 'sharp'
import { describe, expect, it } from 'vitest'
import { preparePhoto } from '../../../../server/features/photos/prepare-photo'
import { PhotoRefusal } from '../../../../server/features/photos/refusals'
import { jpegBytes, orientationSample, picture } from '../../../factories/picture'

const prepare = (bytes: Buffer, name = 'photo', mediaType = 'application/octet-stream') =>
  preparePhoto({ bytes, name, mediaType })

async function refusedAs(bytes: Buffer, name?: string, mediaType?: string): Promise<string> {
  const error: unknown = await prepare(bytes, name, mediaType).then(
    () => new Error('taken'),
    (reason: unknown) => reason,
  )
  if (!(error instanceof PhotoRefusal)) throw error
  return error.code
}

/** Mean difference of two pictures' pixels, 0 to 255. */
async function difference(a: Buffer, b: Buffer): Promise<number> {
  const pixels = (bytes: Buffer) =>
    sharp(bytes).resize(60, 60, { fit: 'fill' }).removeAlpha().raw().toBuffer()
  const [first, second] = await Promise.all([pixels(a), pixels(b)])
  return first.reduce((sum, value, i) => sum + Math.abs(value - (second[i] ?? 0)), 0) / first.length
}

const demo = (name: string) => readFileSync(new URL(`../../../../demo/photos/${name}.jpg`, import.meta.url))

describe('a photo is stored upright', () => {
  const shapes = [
    ['Landscape', 600, 450],
    ['Portrait', 450, 600],
  ] as const
  const cases = shapes.flatMap(([shape, width, height]) =>
    [1, 2, 3, 4, 5, 6, 7, 8].map((orientation) => ({ shape, width, height, orientation })),
  )
  it.each(cases)('$shape, orientation $orientation', async ({ shape, width, height, orientation }) => {
    const prepared = await prepare(orientationSample(shape, orientation))
    expect([prepared.width, prepared.height]).toEqual([width, height])
    // All eight show the same scene once upright; turned or mirrored ones differ by far more.
    expect(await difference(prepared.picture, orientationSample(shape, 1))).toBeLessThan(12)
    expect(await exifr.orientation(prepared.picture)).toBeUndefined()
  })

  it('tells a turned picture from an upright one', async () => {
    const turned = await sharp(orientationSample('Landscape', 1)).rotate(180).jpeg().toBuffer()
    expect(await difference(turned, orientationSample('Landscape', 1))).toBeGreaterThan(25)
  })
})

describe('what is kept of a photo', () => {
  it('is date, focal length and place as the camera wrote them', async () => {
    const { width, height, details } = await prepare(demo('mill-stair'), 'mill-stair.jpg', 'image/jpeg')
    expect([width, height]).toEqual([1500, 2000])
    expect(details.takenAt).toBe('2026-06-02T14:08:51')
    expect(details.focalLength35).toBe(26)
    expect(details.place?.latitude).toBeCloseTo(0.0871, 4)
    expect(details.place?.longitude).toBeCloseTo(-0.1203, 4)
  })

  it('is a JPEG without any of the file’s own details', async () => {
    const { picture: stored, thumbnail } = await prepare(demo('harbour-deck'))
    for (const bytes of [stored, thumbnail]) {
      const { format, exif, xmp, iptc, icc, width, height } = await sharp(bytes).metadata()
      expect({ format, exif, xmp, iptc, icc }).toEqual({ format: 'jpeg' })
      expect(Math.max(width, height)).toBeLessThanOrEqual(2560)
    }
    const small = await sharp(thumbnail).metadata()
    expect([small.width, small.height]).toEqual([480, 360])
  })

  it('is at most 2560 px, never enlarged', async () => {
    expect(await prepare(await jpegBytes(5120, 1000))).toMatchObject({ width: 2560, height: 500 })
    expect(await prepare(await jpegBytes(64, 48))).toMatchObject({ width: 64, height: 48 })
  })

  it('takes PNG and WebP, and lays what is transparent on white', async () => {
    expect((await prepare(await picture().png().toBuffer(), 'a.png', 'image/png')).width).toBe(64)
    expect((await prepare(await picture().webp().toBuffer(), 'a.webp', 'image/webp')).width).toBe(64)
    const clear = await sharp({ create: { width: 8, height: 8, channels: 4, background: '#00000000' } })
      .png()
      .toBuffer()
    const stored = await sharp((await prepare(clear)).picture)
      .raw()
      .toBuffer()
    expect(stored.every((value) => value > 250)).toBe(true)
  })

  it('takes a JPEG that a phone has appended a film or a further picture to', async () => {
    const jpeg = await jpegBytes()
    const film = Buffer.concat([Buffer.from([0, 0, 0, 24]), Buffer.from('ftypmp42'), Buffer.alloc(200, 7)])
    expect((await prepare(Buffer.concat([jpeg, film]))).width).toBe(64)
    expect((await prepare(Buffer.concat([jpeg, jpeg]))).width).toBe(64)
    expect((await prepare(Buffer.concat([jpeg, Buffer.alloc(64)]))).width).toBe(64)
  })

  it('takes a photo whose details are damaged', async () => {
    const withDetails = await picture()
      .withExif({ IFD2: { DateTimeOriginal: 'yesterday' } })
      .jpeg()
      .toBuffer()
    expect((await prepare(withDetails)).details).toEqual({ takenAt: null, focalLength35: null, place: null })
  })
})

const box = (brands: string) => {
  const body = Buffer.from(`ftyp${brands}`)
  const length = Buffer.alloc(4)
  length.writeUInt32BE(body.length + 4)
  return Buffer.concat([length, body, Buffer.alloc(500, 1)])
}

describe('a file that is refused', () => {
  it.each(['heic\0\0\0\0mif1heic', 'mif1\0\0\0\0mif1heic', 'heix\0\0\0\0', 'msf1\0\0\0\0hevc'])(
    'HEIC with brands %j, whatever its name',
    async (brands) => {
      expect(await refusedAs(box(brands), 'IMG_0001.jpg', 'image/jpeg')).toBe('photo-heic')
    },
  )

  it('says how to change HEIC on the phone', async () => {
    await expect(prepare(box('heic\0\0\0\0'))).rejects.toThrow(/camera’s settings.*Most compatible.*JPEG/)
  })

  it('another kind of picture', async () => {
    expect(await refusedAs(box('avif\0\0\0\0mif1avif'))).toBe('photo-kind')
    expect(await refusedAs(await picture().gif().toBuffer())).toBe('photo-kind')
    expect(await refusedAs(await picture().tiff().toBuffer())).toBe('photo-kind')
    const svg = '<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"><script>1</script></svg>'
    expect(await refusedAs(Buffer.from(svg), 'a.jpg', 'image/jpeg')).toBe('photo-kind')
  })

  it('no picture at all', async () => {
    expect(await refusedAs(Buffer.alloc(0))).toBe('photo-empty')
    expect(await refusedAs(Buffer.from('<html><script>alert(1)</script>'), 'a.jpg', 'image/jpeg')).toBe(
      'photo-kind',
    )
    expect(await refusedAs(Buffer.from([0xff, 0xd8, 0xff]))).toBe('photo-broken')
  })

  it('a picture under the name or type of another', async () => {
    const png = await picture().png().toBuffer()
    expect(await refusedAs(png, 'photo.jpg')).toBe('photo-mislabelled')
    expect(await refusedAs(png, 'photo.png', 'image/webp')).toBe('photo-mislabelled')
    expect((await prepare(png, 'photo.PNG', 'IMAGE/PNG')).width).toBe(64)
  })

  it('a moving picture', async () => {
    const frames = Buffer.concat([
      await picture(16, 16).raw().toBuffer(),
      await sharp({ create: { width: 16, height: 16, channels: 3, background: 'red' } })
        .raw()
        .toBuffer(),
    ])
    const animated = await sharp(frames, { raw: { width: 16, height: 32, channels: 3, pageHeight: 16 } })
      .webp()
      .toBuffer()
    expect(await refusedAs(animated)).toBe('photo-animated')
    const still = await picture().png().toBuffer()
    const control = Buffer.from('000000086163544c0000000200000000f38d9370', 'hex')
    expect(await refusedAs(Buffer.concat([still.subarray(0, 33), control, still.subarray(33)]))).toBe(
      'photo-animated',
    )
  })

  it.each(['jpeg', 'png', 'webp'] as const)('a %s that was cut off anywhere', async (format) => {
    const whole = await picture(200, 150).toFormat(format).toBuffer()
    for (const share of [0.02, 0.3, 0.7, 0.99]) {
      expect(await refusedAs(whole.subarray(0, Math.floor(whole.length * share)))).toMatch(
        /^photo-(broken|kind)$/,
      )
    }
  })

  it('a PNG with damaged data', async () => {
    const bytes = await picture(200, 150).png().toBuffer()
    bytes.fill(0, Math.floor(bytes.length / 2), Math.floor(bytes.length / 2) + 400)
    expect(await refusedAs(bytes)).toBe('photo-broken')
  })

  it('more than 60 megapixels, found without decoding', async () => {
    const bomb = await sharp({
      create: { width: 12_000, height: 6000, channels: 3, background: 'white' },
      limitInputPixels: false,
    })
      .png({ compressionLevel: 9 })
      .toBuffer()
    expect(bomb.length).toBeLessThan(1_000_000)
    const before = process.memoryUsage.rss()
    expect(await refusedAs(bomb)).toBe('photo-too-many-pixels')
    expect(process.memoryUsage.rss() - before).toBeLessThan(100_000_000)
  })

  it('a picture that is something else as well', async () => {
    const jpeg = await jpegBytes()
    const png = await picture().png().toBuffer()
    const archive = Buffer.concat([Buffer.from('PK\x05\x06'), Buffer.alloc(18)])
    expect(await refusedAs(Buffer.concat([jpeg, archive]))).toBe('photo-two-kinds')
    expect(await refusedAs(Buffer.concat([png, archive]))).toBe('photo-two-kinds')
    expect(await refusedAs(Buffer.concat([jpeg, Buffer.from('<script>alert(1)</script>')]))).toBe(
      'photo-two-kinds',
    )
    const comment = Buffer.from('<html><script>alert(1)</script>')
    const segment = Buffer.concat([Buffer.from([0xff, 0xfe, 0, comment.length + 2]), comment])
    expect(await refusedAs(Buffer.concat([jpeg.subarray(0, 2), segment, jpeg.subarray(2)]))).toBe(
      'photo-two-kinds',
    )
  })
})
