import type { PhotoPoint } from '@shared/geometry/point'

export type RectangleStep =
  { to: 'idle' } | { to: 'pointing'; corners: PhotoPoint[] } | { to: 'marked'; corners: PhotoPoint[] }
