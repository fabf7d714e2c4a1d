import { writeLength, type LengthFormat } from '@shared/units/format-length'
import { type BayDrawn, bayShape, pathOf, type Spot, type Stretch } from './bay-shape'

const WIDTH = 420

interface BayPictureProps extends BayDrawn {
  format: LengthFormat
  /** Whether the openings, and the stair’s triangle, keep their spheres out. */
  holds: { openings: boolean; triangle: boolean }
}

/** The opening picture: a bay to scale with the rules' sphere in its widest opening. */
export function BayPicture({ format, holds, ...drawn }: BayPictureProps) {
  const { bay } = drawn
  const shape = bayShape(drawn, WIDTH)
  const { sphere, opening, span } = shape
  const said = `Bay ${bay.bay} to scale. ${
    bay.openings.between === undefined
      ? 'It has one cable.'
      : `Its widest opening between cables is ${writeLength(bay.openings.between, format)}; the sphere is ${writeLength(bay.sphere, format)}.`
  }`
  return (
    <svg
      role="img"
      aria-label={said}
      viewBox={`0 0 ${shape.width} ${shape.height}`}
      className="w-full max-w-xl rounded border border-rule bg-card"
    >
      <path d={pathOf(shape.ground)} className="fill-none stroke-ink" strokeWidth="2" />
      {shape.posts.map((post, i) => (
        <path key={i} d={pathOf(post, true)} className="fill-paper stroke-ink" strokeWidth="1" />
      ))}
      <path d={pathOf(shape.rail, true)} className="fill-rule stroke-ink" strokeWidth="1" />
      {shape.spacers.map((line, i) => (
        <Line key={i} line={line} className="stroke-ink" width={2.5} />
      ))}
      {shape.cables.map((line, i) => (
        <Line key={i} line={line} className="stroke-steel" width={1.2} />
      ))}
      {sphere ? <Sphere {...sphere} holds={holds.openings} /> : null}
      {shape.triangle ? <Sphere {...shape.triangle} holds={holds.triangle} /> : null}
      {opening ? <Dimension line={opening} label={writeLength(bay.openings.between ?? 0, format)} /> : null}
      <Dimension line={below(span)} label={writeLength(bay.span, format)} />
    </svg>
  )
}

/** Whole where it is kept out; broken, and in the colour of a stop, where it passes. */
const Sphere = ({ centre, radius, holds }: { centre: Spot; radius: number; holds: boolean }) => (
  <circle
    cx={centre.x}
    cy={centre.y}
    r={radius}
    className={holds ? 'fill-none stroke-spruce' : 'fill-stop-ground stroke-stop'}
    strokeWidth="1.5"
    strokeDasharray={holds ? undefined : '4 3'}
  />
)

const below = ([from, to]: Stretch): Stretch => [
  { x: from.x, y: from.y + 10 },
  { x: to.x, y: to.y + 10 },
]

const Line = ({
  line: [from, to],
  className,
  width,
}: {
  line: Stretch
  className: string
  width: number
}) => <line x1={from.x} y1={from.y} x2={to.x} y2={to.y} className={className} strokeWidth={width} />

/** The taut line with its end ticks, and the figure beside it. */
function Dimension({ line: [from, to], label }: { line: Stretch; label: string }) {
  const length = Math.hypot(to.x - from.x, to.y - from.y)
  const [ux, uy] = length === 0 ? [1, 0] : [(to.x - from.x) / length, (to.y - from.y) / length]
  const tick = ({ x, y }: Spot) =>
    `M${(x - uy * 4).toFixed(2)} ${(y + ux * 4).toFixed(2)}L${(x + uy * 4).toFixed(2)} ${(y - ux * 4).toFixed(2)}`
  const upright = Math.abs(uy) > Math.abs(ux)
  const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 }
  return (
    <g className="stroke-spruce" strokeWidth="1.2" fill="none">
      <path d={`M${from.x} ${from.y}L${to.x} ${to.y}${tick(from)}${tick(to)}`} />
      <text
        x={upright ? middle.x + 26 : middle.x}
        y={upright ? middle.y + 4 : middle.y + 13}
        textAnchor={upright ? 'start' : 'middle'}
        strokeWidth="4"
        paintOrder="stroke"
        className="fill-spruce stroke-card font-condensed text-xs font-semibold"
      >
        {label}
      </text>
    </g>
  )
}
