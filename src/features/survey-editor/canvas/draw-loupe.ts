import type { PhotoPoint } from '@shared/geometry/point'
import { type Camera, toScreen, type Viewport } from '../model/camera'
import type { DrawingColours } from './colours'

const RADIUS = 62
/** How far the loupe stands off the finger, so that the hand does not cover it. */
const OFF = 104
const NEARER = 2.5

interface Loupe {
  at: PhotoPoint
  image: CanvasImageSource
  /** Pixels of the image to a pixel of the photo as the survey counts them. */
  scale: number
  camera: Camera
  viewport: Viewport
  colours: DrawingColours
}

/** A round piece of the photo, enlarged, above the finger; below it at the top edge. */
export function drawLoupe(
  context: CanvasRenderingContext2D,
  { at, image, scale, camera, viewport, colours }: Loupe,
): void {
  const finger = toScreen(camera, at)
  const above = finger.screenY - OFF - RADIUS > 0
  const x = Math.min(viewport.width - RADIUS - 8, Math.max(RADIUS + 8, finger.screenX))
  const y = above ? finger.screenY - OFF : finger.screenY + OFF
  const zoom = Math.max(camera.zoom * NEARER, 1)
  const reach = RADIUS / zoom
  context.save()
  context.beginPath()
  context.arc(x, y, RADIUS, 0, 2 * Math.PI)
  context.fillStyle = colours.paper
  context.fill()
  context.clip()
  context.drawImage(
    image,
    (at[0] - reach) * scale,
    (at[1] - reach) * scale,
    2 * reach * scale,
    2 * reach * scale,
    x - RADIUS,
    y - RADIUS,
    2 * RADIUS,
    2 * RADIUS,
  )
  for (const [colour, width] of [
    [colours.halo, 3],
    [colours.core, 1.5],
  ] as const) {
    context.strokeStyle = colour
    context.lineWidth = width
    context.beginPath()
    context.moveTo(x - 14, y)
    context.lineTo(x + 14, y)
    context.moveTo(x, y - 14)
    context.lineTo(x, y + 14)
    context.stroke()
  }
  context.restore()
  context.beginPath()
  context.arc(x, y, RADIUS, 0, 2 * Math.PI)
  context.strokeStyle = colours.halo
  context.lineWidth = 4
  context.stroke()
  context.strokeStyle = colours.core
  context.lineWidth = 2
  context.stroke()
}
