/** A place on a photo, in pixels of the upright picture, from its top left corner. */
export type PhotoPoint = readonly [x: number, y: number]

/** A place in the plan view, in nanometres; y grows away from the viewer. */
export interface PlanPoint {
  readonly planX: number
  readonly planY: number
}

export const photoPoint = (x: number, y: number): PhotoPoint => [x, y]

/** Distance in pixels. */
export const photoDistance = (a: PhotoPoint, b: PhotoPoint): number => Math.hypot(a[0] - b[0], a[1] - b[1])
