import type { BayCheck } from '@shared/calculation/checks/check-bay'
import type { RunCheck } from '@shared/calculation/checks/check-run'
import type { Ball, Spot, Stretch } from './drawing'

export type GapName = 'between' | 'bottom' | 'top'

/** One of the openings an inspector measures, square to the cables. */
export interface Gap {
  name: GapName
  line: Stretch
  /** Where its figure begins, or ends, clear of the sphere. */
  label: Spot & { ends: boolean }
  /** The sphere that must not pass, where it is drawn. */
  sphere?: Ball
}

export interface BayShape {
  width: number
  height: number
  /** Outlines of both posts. */
  posts: readonly (readonly Spot[])[]
  rail: readonly Spot[]
  /** The walking surface, on a stair its steps. */
  ground: readonly Spot[]
  /** What closes the opening at its bottom, where that is not the ground. */
  sill?: Stretch
  /** Over the steps of a stair. */
  nosings?: Stretch
  cables: readonly Stretch[]
  spacers: readonly Stretch[]
  gaps: readonly Gap[]
  /** Of a step with the lowest member, and the largest sphere that stands in it. */
  triangle?: { outline: readonly Spot[]; sphere: Ball; label: Spot }
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
  /** The sphere that must not pass above the highest cable, nm. */
  topSphere: number
}

const MARGIN = 10
/** Above the rail, for the span's dimension line. */
const HEAD = 34
const FOOT = 10
const MOST_HEIGHT = 300
/** Between the rail and the span's dimension line. */
const OFF = 12
/** Between a dimension line or its sphere and the figure. */
const BESIDE = 7
/** Half the height of a figure. */
const HALF_TEXT = 4.5

/** Puts a place so far along the bay and so high above the nosing line on the drawing; nm in. */
type Place = (along: number, height: number) => Spot

interface Frame {
  at: Place
  scale: number
  /** Clear, level, nm. */
  across: number
}

/**
 * One bay to scale: posts, rail, ground or steps, every cable, and the rules' sphere in the widest opening. On a stair
 * everything but the posts runs along the pitch, and openings are measured square to the cables.
 */
export function bayShape(drawn: BayDrawn, width: number): BayShape {
  const { bay, run, guardHeight, postWidth } = drawn
  const across = bay.length * Math.cos(bay.theta)
  const tan = Math.tan(bay.theta)
  const inner = width - 2 * MARGIN
  // The lower post of a stair stands one step below the first nosing.
  const [above, below] = [guardHeight + (across + postWidth) * tan, bay.triangle?.riser ?? 0]
  const scale = Math.min(inner / (across + 2 * postWidth), MOST_HEIGHT / (above + below))
  const left = MARGIN + (inner - across * scale) / 2
  const level = HEAD + above * scale
  const at: Place = (along, height) => ({
    x: left + along * scale,
    y: level - (along * tan + height) * scale,
  })
  const frame = { at, scale, across }
  const { bottom, top } = run.opening
  return {
    width,
    height: level + below * scale + FOOT,
    posts: [
      { from: -postWidth, floor: -below },
      { from: across, floor: across * tan },
    ].map(({ from, floor }) => {
      const foot = (along: number) => at(along, floor - along * tan)
      return [foot(from), at(from, top), at(from + postWidth, top), foot(from + postWidth)]
    }),
    rail: [
      at(-postWidth, top),
      at(-postWidth, guardHeight),
      at(across + postWidth, guardHeight),
      at(across + postWidth, top),
    ],
    ground: groundOf(bay, postWidth, frame),
    ...(bottom > 0 ? { sill: [at(0, bottom), at(across, bottom)] as const } : {}),
    ...(bay.triangle ? { nosings: [at(0, 0), at(across, 0)] as const } : {}),
    cables: run.heights.map((height) => [at(0, height), at(across, height)] as const),
    spacers: Array.from({ length: bay.spacers }, (_, i) => {
      const along = (across * (i + 1)) / (bay.spacers + 1)
      return [at(along, bottom), at(along, top)] as const
    }),
    gaps: gapsOf(drawn, frame),
    ...triangleOf(bay, frame),
    span: [raised(at(0, guardHeight)), raised(at(across / (bay.spacers + 1), guardHeight))],
  }
}

const raised = ({ x, y }: Spot): Spot => ({ x, y: y - OFF })

/** Where along the bay each opening is measured, as shares: apart, so that their figures do not meet. */
const levelPlaces: Record<GapName, number> = { bottom: 0.12, between: 0.42, top: 0.72 }
const stairPlaces: Record<GapName, number> = { top: 0.55, between: 0.62, bottom: 0.92 }

/** The openings with their dimension lines; the sphere goes in the widest between cables, and where it is worse. */
function gapsOf({ bay, run, diameter, topSphere }: BayDrawn, { at, scale, across }: Frame): Gap[] {
  const { openings, sphere, theta } = bay
  const [cos, sin] = [Math.cos(theta), Math.sin(theta)]
  const places = bay.theta > 0 ? stairPlaces : levelPlaces
  const [lower, upper] =
    openings.above === undefined ? [] : run.heights.slice(openings.above - 1, openings.above + 1)
  const thick = diameter / 2
  const edges = [
    ...(lower === undefined || upper === undefined || openings.between === undefined
      ? []
      : [{ name: 'between', size: openings.between, limit: sphere, middle: (lower + upper) / 2 } as const]),
    {
      name: 'bottom',
      size: openings.bottom,
      limit: sphere,
      middle: (run.opening.bottom + (run.heights[0] ?? 0) - thick) / 2,
    } as const,
    {
      name: 'top',
      size: openings.top,
      limit: topSphere,
      middle: (run.opening.top + openings.highest + thick) / 2,
    } as const,
  ]
  const spheres = spheresIn(edges)
  return edges
    .filter(({ size }) => size > 0)
    .map(({ name, size, limit, middle }) => {
      const centre = at(across * places[name], middle)
      const half = (size / 2) * scale
      const radius = (limit / 2) * scale
      const beside = BESIDE + (spheres.has(name) ? radius : 0)
      // On a stair the steps come up on the right of what is low, the rail comes down on the left of what is high.
      const ends = theta > 0 && name !== 'top'
      return {
        name,
        line: [
          { x: centre.x + sin * half, y: centre.y + cos * half },
          { x: centre.x - sin * half, y: centre.y - cos * half },
        ],
        label: { x: centre.x + (ends ? -beside : beside), y: centre.y + HALF_TEXT, ends },
        ...(spheres.has(name) ? { sphere: { centre, radius } } : {}),
      }
    })
}

/** The widest opening between cables, or for want of one the worse of the others, and what is worse still. */
function spheresIn(edges: readonly { name: GapName; size: number; limit: number }[]): ReadonlySet<GapName> {
  const over = ({ size, limit }: { size: number; limit: number }) => size - limit
  const first =
    edges.find(({ name }) => name === 'between') ?? [...edges].sort((a, b) => over(b) - over(a))[0]
  return new Set(
    edges.filter((edge) => edge === first || (first && over(edge) > over(first))).map(({ name }) => name),
  )
}

/** A step well inside the bay, so that what lies under its lowest member is drawn whole where it can be. */
function triangleOf({ triangle }: BayCheck, { at, scale, across }: Frame): Pick<BayShape, 'triangle'> {
  if (!triangle || triangle.tread > across) return {}
  const { riser, tread, upright } = { ...triangle, upright: triangleUpright(triangle) }
  const base = (upright * tread) / riser
  const steps = Math.floor(across / tread + 1e-9)
  const step = Math.min(steps, Math.max(1, Math.ceil(base / tread - 1e-9)))
  const along = step * tread
  // The foot of the riser; the tread before it lies one riser below the nosing line there.
  const corner = at(along, -riser)
  const radius = (triangle.sphere / 2) * scale
  return {
    triangle: {
      outline: [
        corner,
        { x: corner.x, y: corner.y - upright * scale },
        { x: corner.x - base * scale, y: corner.y },
      ],
      // It touches tread, riser and lowest member: it stands its radius away from the step's inner corner.
      sphere: { centre: { x: corner.x - radius, y: corner.y - radius }, radius },
      // Under the steps nothing else is drawn.
      label: { x: corner.x + 4, y: corner.y + 14 },
    },
  }
}

/** The upright side of the triangle from its inscribed circle: `2r = a · (1 + g/r − √(1 + (g/r)²))`. */
const triangleUpright = ({
  sphere,
  riser,
  tread,
}: {
  sphere: number
  riser: number
  tread: number
}): number => sphere / (1 + tread / riser - Math.hypot(1, tread / riser))

/** Level ground, or treads and risers below the nosing line from the lower post up. */
function groundOf({ triangle, theta }: BayCheck, postWidth: number, { at, across }: Frame): Spot[] {
  if (!triangle) return [at(-postWidth, 0), at(across + postWidth, 0)]
  const { riser, tread } = triangle
  const tan = Math.tan(theta)
  const spots = [at(-postWidth, -riser + postWidth * tan), at(0, -riser), at(0, 0)]
  for (let along = 0; along < across - 1; along += tread) {
    const end = Math.min(across, along + tread)
    // From a nosing the tread goes in level, and the riser up to the next nosing.
    spots.push(at(end, (along - end) * tan), at(end, 0))
  }
  return [...spots, at(across + postWidth, -postWidth * tan)]
}
