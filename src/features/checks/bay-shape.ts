import type { BayCheck } from '@shared/calculation/checks/check-bay'
import type { RunCheck } from '@shared/calculation/checks/check-run'

/** A place on the drawing, in its own units, y downwards. */
export interface Spot {
  x: number
  y: number
}
export type Stretch = readonly [Spot, Spot]

export interface BayShape {
  width: number
  height: number
  /** Outlines of both posts. */
  posts: readonly (readonly Spot[])[]
  rail: readonly Spot[]
  /** The walking surface, on a stair its steps. */
  ground: readonly Spot[]
  cables: readonly Stretch[]
  spacers: readonly Stretch[]
  /** The sphere that must not pass, in the widest opening. */
  sphere?: { centre: Spot; radius: number }
  /** The largest sphere that stands in the triangle of the first step. */
  triangle?: { centre: Spot; radius: number }
  /** Where the widest opening is measured, cable to cable. */
  opening?: Stretch
  span: Stretch
}

export interface BayDrawn {
  bay: BayCheck
  run: RunCheck
  /** Of the guard, and of its posts along the run, nm. */
  guardHeight: number
  postWidth: number
  /** The clear diameter of a cable, nm. */
  diameter: number
}

const MARGIN = 12
/** Below the ground, for the span's dimension line. */
const FOOT = 26
const MOST_HEIGHT = 260

/**
 * One bay to scale: posts, rail, ground or steps, every cable, and the rules' sphere in the widest opening. On a stair
 * everything but the posts runs along the pitch; heights stay upright, as they are measured.
 */
export function bayShape({ bay, run, guardHeight, postWidth, diameter }: BayDrawn, width: number): BayShape {
  const { theta, length, openings, sphere, spacers } = bay
  const [across, rise] = [length * Math.cos(theta), length * Math.sin(theta)]
  const tan = Math.tan(theta)
  const inner = width - 2 * MARGIN
  const scale = Math.min(
    inner / (across + 2 * postWidth),
    (MOST_HEIGHT - MARGIN - FOOT) / (guardHeight + rise + postWidth * tan),
  )
  const left = MARGIN + (inner - (across + 2 * postWidth) * scale) / 2 + postWidth * scale
  const ground = MARGIN + (guardHeight + rise + postWidth * tan) * scale
  /** A height above the nosing line, so far along the bay; nm. */
  const at = (along: number, height: number): Spot => ({
    x: left + along * scale,
    y: ground - (along * tan + height) * scale,
  })
  const line = (height: number): Stretch => [at(0, height), at(across, height)]
  const widest =
    openings.above === undefined ? undefined : run.heights.slice(openings.above - 1, openings.above + 1)
  const [lower, upper] = widest ?? []
  const middle = across / 2
  const postAt = (from: number) => [
    at(from, -from * tan + Math.min(from, from + postWidth) * tan),
    at(from, run.opening.top),
    at(from + postWidth, run.opening.top),
    at(from + postWidth, 0),
  ]
  return {
    width,
    height: ground + FOOT,
    posts: [postAt(-postWidth), postAt(across)],
    rail: [
      at(-postWidth, run.opening.top),
      at(-postWidth, guardHeight),
      at(across + postWidth, guardHeight),
      at(across + postWidth, run.opening.top),
    ],
    ground: theta === 0 ? [at(-postWidth, 0), at(across + postWidth, 0)] : steps(bay, across, at),
    cables: run.heights.map(line),
    spacers: Array.from({ length: spacers }, (_, i) => {
      const along = (across * (i + 1)) / (spacers + 1)
      return [at(along, run.opening.bottom), at(along, run.opening.top)] as const
    }),
    ...(lower === undefined || upper === undefined
      ? {}
      : {
          sphere: { centre: at(middle, (lower + upper) / 2), radius: (sphere / 2) * scale },
          opening: [
            at(middle, lower + diameter / 2 / Math.cos(theta)),
            at(middle, upper - diameter / 2 / Math.cos(theta)),
          ] as const,
        }),
    ...triangleOf(bay, { at, scale, across }),
    span: [at(0, 0), at(across / (spacers + 1), 0)],
  }
}

/** The sphere touches tread, riser and lowest member: it stands its radius away from the step’s inner corner. */
function triangleOf(
  { triangle }: BayCheck,
  { at, scale, across }: { at: (along: number, height: number) => Spot; scale: number; across: number },
): Pick<BayShape, 'triangle'> {
  if (!triangle || triangle.tread > across) return {}
  const radius = (triangle.sphere / 2) * scale
  const corner = at(triangle.tread, -triangle.riser)
  return { triangle: { centre: { x: corner.x - radius, y: corner.y - radius }, radius } }
}

/** Treads and risers below the nosing line, from the lower post up. */
function steps({ triangle }: BayCheck, across: number, at: (along: number, height: number) => Spot): Spot[] {
  if (!triangle) return [at(0, 0), at(across, 0)]
  const { riser, tread } = triangle
  const spots = [at(0, 0)]
  for (let along = 0; along < across; along += tread) {
    const end = Math.min(across, along + tread)
    // From a nosing the tread goes in level, and the riser up to the next nosing.
    spots.push(at(end, (-riser * (end - along)) / tread), at(end, 0))
  }
  return spots
}

export const pathOf = (spots: readonly Spot[], closed = false): string =>
  `${spots.map(({ x, y }, i) => `${i === 0 ? 'M' : 'L'}${x.toFixed(2)} ${y.toFixed(2)}`).join('')}${closed ? 'Z' : ''}`
