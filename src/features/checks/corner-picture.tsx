import type { CornerCheck } from '@shared/calculation/checks/check-corners'
import { type LengthFormat, writeLength } from '@shared/units/format-length'
import { type Box, cornerShape } from './corner-shape'

const SIDE = 240

/** A corner post in section, to scale, with both holes and where they meet. */
export function CornerPicture({ corner, format }: { corner: CornerCheck; format: LengthFormat }) {
  const shape = cornerShape(corner, SIDE)
  const { a, b, overlap } = corner
  const meeting =
    overlap > 0
      ? `they overlap by ${writeLength(overlap, format)}`
      : `${writeLength(-overlap, format)} of wood stay between them`
  return (
    <svg
      role="img"
      aria-label={`Post ${corner.post} in section, to scale: at one height the hole of run ${a.run} is ${writeLength(a.fitting.body, format)} deep, that of run ${b.run} ${writeLength(b.fitting.body, format)}; ${meeting}.`}
      viewBox={`0 0 ${SIDE} ${SIDE}`}
      className="w-full max-w-60 rounded border border-rule bg-card"
    >
      <Rect box={shape.post} className="fill-paper stroke-ink" />
      <Rect box={shape.core} className="fill-rule stroke-none" />
      <Rect box={shape.a} className="fill-card stroke-spruce" />
      <Rect box={shape.b} className="fill-card stroke-chalk" />
      {shape.overlap ? <Rect box={shape.overlap} className="fill-stop-ground stroke-stop" /> : null}
      <Label box={shape.a} text={a.run} className="fill-spruce" />
      <Label box={shape.b} text={b.run} className="fill-chalk" />
    </svg>
  )
}

const Rect = ({ box, className }: { box: Box; className: string }) => (
  <rect {...box} className={className} strokeWidth="1.5" />
)

/** Beside the hole's mouth, clear of where the holes meet. */
function Label({ box, text, className }: { box: Box; text: string; className: string }) {
  const lying = box.width >= box.height
  return (
    <text
      x={lying ? box.x + 4 : box.x + box.width + 4}
      y={lying ? box.y - 4 : box.y + box.height - 6}
      className={`${className} font-condensed text-sm font-semibold`}
    >
      {text}
    </text>
  )
}
