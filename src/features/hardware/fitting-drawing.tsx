import { type LengthFormat, writeLength } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { type DrawnFitting, fittingShape, type Span } from './fitting-shape'

const WIDTH = 320
const MARGIN = 10
const TOP = 8
const POST_HEIGHT = 112
const AXIS = TOP + POST_HEIGHT / 2
const ROW = 18

interface FittingDrawingProps {
  fitting: DrawnFitting
  format: LengthFormat
}

/** The fitting in a post, to scale: body, head, where the bare cable ends and how far it can be pulled. */
export function FittingDrawing({ fitting, format }: FittingDrawingProps) {
  const shape = fittingShape(fitting, WIDTH)
  const { body, cutPastFace, depth, head, takeUp } = shape
  const dimensions: readonly { name: string; span: Span; value: number }[] = [
    ...(body ? [{ name: 'body', span: body, value: fitting.body }] : []),
    { name: 'head projection', span: head, value: fitting.headProjection },
    { name: 'cut past face', span: cutPastFace, value: fitting.cutPastFace },
    { name: 'take-up', span: takeUp, value: fitting.takeUp },
  ]
  const bottom = TOP + POST_HEIGHT + dimensions.length * ROW + 12
  const where = depth < 0 ? 'before' : 'past'
  const said = `The bare cable ends ${writeLength(Math.abs(depth), format)} ${where} the post’s face.`
  return (
    <figure className="rounded border border-rule bg-card p-3">
      <svg
        role="img"
        aria-label={`The fitting in its post, to scale. ${said}`}
        viewBox={`0 0 ${WIDTH + 2 * MARGIN} ${bottom}`}
        className="w-full max-w-lg"
      >
        <g transform={`translate(${MARGIN} 0)`}>
          <Parts shape={shape} />
          {dimensions.map(({ name, span }, row) => (
            <Dimension key={name} span={span} y={TOP + POST_HEIGHT + 16 + row * ROW} letter={letterOf(row)} />
          ))}
        </g>
      </svg>
      <figcaption className="mt-2 text-sm">
        <ul className="flex flex-wrap gap-x-5 gap-y-1 text-soft">
          {dimensions.map(({ name, value }, row) => (
            <li key={name}>
              <b className="font-semibold text-ink">{letterOf(row)}</b> {name}{' '}
              <Length value={value} format={format} />
            </li>
          ))}
        </ul>
        <p className="mt-1">
          The bare cable ends <Length value={Math.abs(depth)} format={format} look="computed" /> {where} the
          post’s face. To scale, in a post of <Length value={shape.postDepth} format={format} />.
        </p>
      </figcaption>
    </figure>
  )
}

const letterOf = (row: number): string => 'abcd'.charAt(row)

function Parts({ shape }: { shape: ReturnType<typeof fittingShape> }) {
  const { post, body, head, cable, bodyHeight, headHeight } = shape
  return (
    <>
      <rect x={post.from} y={TOP} width={post.to - post.from} height={POST_HEIGHT} className="fill-rule" />
      <text x={post.from + 8} y={TOP + 16} className="fill-ink font-condensed text-xs">
        post
      </text>
      {body ? <Box span={body} height={Math.min(bodyHeight, POST_HEIGHT)} /> : null}
      <Box span={head} height={Math.min(headHeight, POST_HEIGHT)} />
      <Upright x={post.from} className="stroke-ink" />
      <Upright x={post.to} className="stroke-ink" />
      <Taut span={cable} y={AXIS} className="stroke-spruce" tick={9} />
      <text x={cable.to} y={AXIS - 8} textAnchor="end" className="fill-spruce font-condensed text-xs">
        cable
      </text>
    </>
  )
}

const Box = ({ span, height }: { span: Span; height: number }) => (
  <rect
    x={span.from}
    y={AXIS - height / 2}
    width={Math.max(1, span.to - span.from)}
    height={height}
    className="fill-card stroke-ink"
    strokeWidth="1.5"
  />
)

const Upright = ({ x, className }: { x: number; className: string }) => (
  <line x1={x} x2={x} y1={TOP} y2={TOP + POST_HEIGHT} className={className} strokeWidth="1.5" />
)

interface TautProps {
  span: Span
  y: number
  className: string
  /** Half the height of the tick at its beginning. */
  tick: number
}

/** The cable: a straight line that begins with a tick and leaves the drawing. */
const Taut = ({ span, y, className, tick }: TautProps) => (
  <path
    d={`M${span.from} ${y - tick}V${y + tick}M${span.from} ${y}H${span.to}`}
    className={className}
    strokeWidth="2"
  />
)

/** A dimension line between two ticks, its letter at the right. */
const Dimension = ({ span, y, letter }: { span: Span; y: number; letter: string }) => (
  <>
    <path
      d={`M${span.from} ${y - 4}v8M${span.to} ${y - 4}v8M${span.from} ${y}H${span.to}`}
      className="stroke-steel"
      strokeWidth="1.5"
    />
    <text x={span.to + 6} y={y + 4} className="fill-ink font-condensed text-xs font-semibold">
      {letter}
    </text>
  </>
)
