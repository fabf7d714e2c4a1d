/** A place on a drawing, in its own units, y downwards. */
export interface Spot {
  x: number
  y: number
}
export type Stretch = readonly [Spot, Spot]

/** A rectangle on a drawing. */
export interface Box {
  x: number
  y: number
  width: number
  height: number
}

export interface Ball {
  centre: Spot
  radius: number
}

export const pathOf = (spots: readonly Spot[], closed = false): string =>
  `${spots.map(({ x, y }, i) => `${i === 0 ? 'M' : 'L'}${x.toFixed(2)} ${y.toFixed(2)}`).join('')}${closed ? 'Z' : ''}`

export const between = ([from, to]: Stretch): Spot => ({ x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 })

/** Half the length of an end tick. */
const TICK = 4

/** The two short ticks that hold a line at its ends, square to it. A line without length gets upright ones. */
export function endTicks([from, to]: Stretch): [Stretch, Stretch] {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  const [ux, uy] = length === 0 ? [1, 0] : [(to.x - from.x) / length, (to.y - from.y) / length]
  const tick = ({ x, y }: Spot): Stretch => [
    { x: x - uy * TICK, y: y + ux * TICK },
    { x: x + uy * TICK, y: y - ux * TICK },
  ]
  return [tick(from), tick(to)]
}

/** What two rectangles share. @returns undefined when they only touch, or do not */
export function meet(a: Box, b: Box): Box | undefined {
  const x = Math.max(a.x, b.x)
  const y = Math.max(a.y, b.y)
  const width = Math.min(a.x + a.width, b.x + b.width) - x
  const height = Math.min(a.y + a.height, b.y + b.height) - y
  return width > 0 && height > 0 ? { x, y, width, height } : undefined
}
