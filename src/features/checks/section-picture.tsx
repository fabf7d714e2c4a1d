import { Dimension, Rect } from './dimension'
import { pathOf, type Stretch } from './drawing'
import type { FittingDrawn, SectionShape } from './section-shape'

interface SectionPictureProps {
  shape: SectionShape
  /** The drawing in words. */
  said: string
  /** The runs, in the order of the fittings, where there are several. */
  names?: readonly string[]
  /** The figures of the dimension lines. */
  back?: string | undefined
  edge?: string | undefined
}

const strokes = ['stroke-spruce', 'stroke-chalk print:stroke-ink'] as const
const fills = ['fill-spruce', 'fill-chalk print:fill-ink'] as const

/** A post cut level at the cable's height, to scale: cover, core, holes and bodies. */
export function SectionPicture({ shape, said, names = [], back, edge }: SectionPictureProps) {
  const { post, core, fittings, overlap, width, height } = shape
  return (
    <svg
      role="img"
      aria-label={said}
      viewBox={`0 0 ${width.toFixed(2)} ${height.toFixed(2)}`}
      className="w-full max-w-72 rounded border border-rule bg-card"
    >
      <Rect box={post} className="fill-paper stroke-ink" />
      <Rect
        box={core}
        className={
          core.width < post.width
            ? 'fill-rule stroke-ink [stroke-dasharray:3_2] print:fill-paper'
            : 'fill-rule stroke-ink print:fill-paper'
        }
      />
      {fittings.map((fitting, i) => (
        <FittingIn key={i} fitting={fitting} index={i === 0 ? 0 : 1} name={names[i]} />
      ))}
      {overlap ? (
        <Rect box={overlap} className="fill-stop stroke-stop print:fill-ink print:stroke-ink" />
      ) : null}
      {shape.back && back ? <Dimension line={shape.back} label={back} /> : null}
      {shape.edge && edge ? <Dimension line={shape.edge} label={edge} at={beside(shape.edge)} /> : null}
    </svg>
  )
}

const beside = ([from, to]: Stretch) => ({ x: from.x + 8, y: (from.y + to.y) / 2 + 4.5 })

function FittingIn({
  fitting: { hole, body, head, cable },
  index,
  name,
}: {
  fitting: FittingDrawn
  index: 0 | 1
  name: string | undefined
}) {
  const end = cable[1]
  return (
    <g>
      <path d={pathOf(cable)} className="stroke-steel print:stroke-ink" strokeWidth="2" />
      {hole ? <Rect box={hole} className={`fill-card ${strokes[index]}`} /> : null}
      {body ? <rect {...body} className={fills[index]} fillOpacity="0.35" /> : null}
      <rect {...head} className={fills[index]} />
      {name ? (
        <text
          x={end.x + 4}
          y={index === 0 ? end.y - 6 : end.y - 4}
          className={`${fills[index]} font-condensed text-sm font-semibold`}
        >
          {name}
        </text>
      ) : null}
    </g>
  )
}
