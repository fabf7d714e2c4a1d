import { type LengthFormat, writeLength } from '@shared/units/format-length'
import { type BayDrawn, bayShape, type GapName } from './bay-shape'
import { Dimension, Figure } from './dimension'
import { type Ball, pathOf, type Stretch } from './drawing'

/** Narrow, so that figures can be read where the drawing is shown on a phone. */
const WIDTH = 340

interface BayPictureProps extends BayDrawn {
  format: LengthFormat
  /** Whether each opening, and the stair's triangle, keeps its sphere out. */
  holds: Record<GapName | 'triangle', boolean>
}

/** The opening picture: a bay to scale with the rules' sphere in its widest opening. */
export function BayPicture({ format, holds, ...drawn }: BayPictureProps) {
  const { bay } = drawn
  const shape = bayShape(drawn, WIDTH)
  const { triangle } = shape
  const write = (value: number) => writeLength(value, format)
  return (
    <svg
      role="img"
      aria-label={spoken(drawn, write, holds)}
      viewBox={`0 0 ${shape.width} ${shape.height.toFixed(2)}`}
      className="w-full max-w-md rounded border border-rule bg-card"
    >
      <path d={pathOf(shape.ground)} className="fill-none stroke-ink" strokeWidth="2" />
      {shape.posts.map((post, i) => (
        <path key={i} d={pathOf(post, true)} className="fill-paper stroke-ink" strokeWidth="1" />
      ))}
      <path d={pathOf(shape.rail, true)} className="fill-rule stroke-ink print:fill-paper" strokeWidth="1" />
      {shape.sill ? <Line line={shape.sill} className="stroke-ink" width={2} /> : null}
      {shape.nosings ? <Line line={shape.nosings} className="stroke-ink" width={0.8} dashes="5 3" /> : null}
      {shape.spacers.map((line, i) => (
        <Line key={i} line={line} className="stroke-ink" width={3} />
      ))}
      {shape.cables.map((line, i) => (
        <Line key={i} line={line} className="stroke-steel print:stroke-ink" width={1} />
      ))}
      {triangle ? (
        <path
          d={pathOf(triangle.outline, true)}
          className="fill-none stroke-spruce"
          strokeWidth="1"
          strokeDasharray="2 2"
        />
      ) : null}
      {triangle ? <Sphere {...triangle.sphere} holds={holds.triangle} /> : null}
      {triangle && bay.triangle ? (
        <Figure at={triangle.label} anchor="start" label={write(bay.triangle.sphere)} />
      ) : null}
      {shape.gaps.map(({ name, sphere }) =>
        sphere ? <Sphere key={name} {...sphere} holds={holds[name]} /> : null,
      )}
      {shape.gaps.map(({ name, line, label }) => (
        <Dimension key={name} line={line} at={label} label={write(bay.openings[name] ?? 0)} />
      ))}
      <Dimension line={shape.span} label={write(bay.span)} />
    </svg>
  )
}

/** The drawing in words. */
function spoken(
  { bay }: BayDrawn,
  write: (value: number) => string,
  holds: BayPictureProps['holds'],
): string {
  const { between, bottom, top } = bay.openings
  const { triangle, spacers } = bay
  const passes = (name: GapName | 'triangle') => (holds[name] ? '' : ', which is too wide')
  return [
    `Bay ${bay.bay} to scale, ${spacers === 0 ? 'no' : spacers} ${spacers === 1 ? 'spacer' : 'spacers'}, span ${write(bay.span)}.`,
    between === undefined
      ? 'It has one cable.'
      : `Its widest opening between cables is ${write(between)}${passes('between')}; the sphere is ${write(bay.sphere)}.`,
    `Below the lowest cable ${write(bottom)}${passes('bottom')}, above the highest ${write(top)}${passes('top')}.`,
    ...(triangle
      ? [`In the stair triangle stands a sphere of ${write(triangle.sphere)}${passes('triangle')}.`]
      : []),
  ].join(' ')
}

/** Whole where it is kept out; broken, and in the colour of a stop, where it passes. */
const Sphere = ({ centre, radius, holds }: Ball & { holds: boolean }) => (
  <circle
    cx={centre.x}
    cy={centre.y}
    r={radius}
    className={holds ? 'fill-none stroke-spruce' : 'fill-none stroke-stop print:stroke-ink'}
    strokeWidth={holds ? 1.5 : 2}
    strokeDasharray={holds ? undefined : '4 3'}
  />
)

interface LineProps {
  line: Stretch
  className: string
  width: number
  dashes?: string
}

const Line = ({ line: [from, to], className, width, dashes }: LineProps) => (
  <line
    x1={from.x}
    y1={from.y}
    x2={to.x}
    y2={to.y}
    className={className}
    strokeWidth={width}
    strokeDasharray={dashes}
  />
)
