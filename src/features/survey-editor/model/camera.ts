import type { PhotoPoint } from '@shared/geometry/point'

/** A place on the screen, in CSS pixels from the canvas's top left corner. */
export interface ScreenPoint {
  readonly screenX: number
  readonly screenY: number
}

export interface Viewport {
  width: number
  height: number
}

/** How a photo lies on the screen: `zoom` screen pixels to a photo pixel, its corner at `left`, `top`. */
export interface Camera {
  readonly zoom: number
  readonly left: number
  readonly top: number
}

export const MAX_ZOOM = 8
/** Smallest zoom, as a share of the zoom that shows the photo whole. */
const LEAST_OF_FIT = 0.5

export const screenPoint = (screenX: number, screenY: number): ScreenPoint => ({ screenX, screenY })
export const screenDistance = (a: ScreenPoint, b: ScreenPoint): number =>
  Math.hypot(a.screenX - b.screenX, a.screenY - b.screenY)

export const toPhoto = ({ zoom, left, top }: Camera, { screenX, screenY }: ScreenPoint): PhotoPoint => [
  (screenX - left) / zoom,
  (screenY - top) / zoom,
]
export const toScreen = ({ zoom, left, top }: Camera, [x, y]: PhotoPoint): ScreenPoint =>
  screenPoint(x * zoom + left, y * zoom + top)

/** The camera that shows a picture whole, in the middle. */
export function fit(picture: Viewport, viewport: Viewport): Camera {
  const zoom = Math.min(viewport.width / picture.width, viewport.height / picture.height) || 1
  return {
    zoom,
    left: (viewport.width - picture.width * zoom) / 2,
    top: (viewport.height - picture.height * zoom) / 2,
  }
}

/** Zooms by a factor with one place of the screen held still. */
export function zoomAround(
  camera: Camera,
  { at, factor, least }: { at: ScreenPoint; factor: number; least: number },
): Camera {
  const zoom = Math.min(MAX_ZOOM, Math.max(least, camera.zoom * factor))
  const [x, y] = toPhoto(camera, at)
  return { zoom, left: at.screenX - x * zoom, top: at.screenY - y * zoom }
}

export const leastZoom = (picture: Viewport, viewport: Viewport): number =>
  fit(picture, viewport).zoom * LEAST_OF_FIT

export const panBy = (camera: Camera, dx: number, dy: number): Camera => ({
  ...camera,
  left: camera.left + dx,
  top: camera.top + dy,
})

/** Keeps at least a corner's worth of the picture in view, so that it cannot be lost. */
export function keepInView(camera: Camera, picture: Viewport, viewport: Viewport): Camera {
  const margin = Math.min(80, viewport.width / 4, viewport.height / 4)
  const clamp = (value: number, size: number, room: number) =>
    Math.min(room - margin, Math.max(margin - size, value))
  return {
    ...camera,
    left: clamp(camera.left, picture.width * camera.zoom, viewport.width),
    top: clamp(camera.top, picture.height * camera.zoom, viewport.height),
  }
}

/** Two fingers hold two places of the photo; the camera that keeps both under them. */
export function pinch(
  start: { camera: Camera; fingers: readonly [ScreenPoint, ScreenPoint] },
  now: readonly [ScreenPoint, ScreenPoint],
  least: number,
): Camera {
  const middle = ([a, b]: readonly [ScreenPoint, ScreenPoint]) =>
    screenPoint((a.screenX + b.screenX) / 2, (a.screenY + b.screenY) / 2)
  const spread = screenDistance(...start.fingers) || 1
  const from = middle(start.fingers)
  const to = middle(now)
  const zoomed = zoomAround(start.camera, { at: from, factor: screenDistance(...now) / spread, least })
  return panBy(zoomed, to.screenX - from.screenX, to.screenY - from.screenY)
}
