import type { Fitting } from '@shared/schemas/hardware'
import { inches } from '@shared/units/length'

const POST = inches(3.5)

/** The fitting in a 3 1/2 in post, to scale: body, head, and where the bare cable ends. */
export function FittingDrawing({
  fitting,
}: {
  fitting: Pick<Fitting, 'mount' | 'body' | 'headProjection' | 'cutPastFace'>
}) {
  const { mount, body, headProjection, cutPastFace } = fitting
  const reach = Math.max(headProjection, inches(1)) + inches(2)
  const scale = 320 / (POST + reach)
  const x = (nm: number) => 10 + nm * scale
  // Post face at POST; the cable comes from the right.
  const outer = POST + headProjection
  const end = outer - cutPastFace
  return (
    <svg
      role="img"
      aria-label="The fitting in a post of 3 1/2 in, to scale"
      viewBox="0 0 340 130"
      className="w-full max-w-md rounded border border-rule bg-paper"
    >
      <rect
        x={x(0)}
        y="15"
        width={POST * scale}
        height="100"
        className="fill-rule stroke-ink"
        strokeWidth="1.5"
      />
      {mount === 'drilled' ? (
        <rect
          x={x(POST - body)}
          y="54"
          width={body * scale}
          height="22"
          className="fill-card stroke-ink"
          strokeWidth="1.5"
        />
      ) : null}
      <rect
        x={x(POST)}
        y="46"
        width={Math.max(1, headProjection * scale)}
        height="38"
        className="fill-card stroke-ink"
        strokeWidth="1.5"
      />
      <line x1={x(end)} x2="330" y1="65" y2="65" className="stroke-spruce" strokeWidth="4" />
      <line x1={x(end)} x2={x(end)} y1="40" y2="90" className="stroke-spruce" strokeWidth="2" />
      <line
        x1={x(POST)}
        x2={x(POST)}
        y1="8"
        y2="122"
        className="stroke-steel"
        strokeWidth="1"
        strokeDasharray="4 3"
      />
      <text x={x(POST) - 4} y="12" textAnchor="end" className="figures fill-soft text-xs">
        post face
      </text>
      <text x={x(end)} y="106" textAnchor="middle" className="figures fill-spruce text-xs">
        cable ends
      </text>
    </svg>
  )
}
