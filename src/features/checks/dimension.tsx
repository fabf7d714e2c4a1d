import { between, type Box, endTicks, pathOf, type Spot, type Stretch } from './drawing'

interface DimensionProps {
  line: Stretch
  label: string
  /** Where the label begins, or ends; left out, it rides on the line. */
  at?: (Spot & { ends?: boolean }) | undefined
}

/** The taut line with its two end ticks, and the computed figure beside it. */
export function Dimension({ line, label, at }: DimensionProps) {
  const middle = between(line)
  const [from, to] = line
  const turned = (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI
  return (
    <g>
      <path
        d={[line, ...endTicks(line)].map((each) => pathOf(each)).join('')}
        className="fill-none stroke-steel print:stroke-ink"
        strokeWidth="2"
      />
      {at ? (
        <Figure at={at} anchor={at.ends ? 'end' : 'start'} label={label} />
      ) : (
        <g transform={`rotate(${turned} ${middle.x} ${middle.y})`}>
          <Figure at={{ x: middle.x, y: middle.y - 7 }} anchor="middle" label={label} />
        </g>
      )}
    </g>
  )
}

interface FigureProps {
  at: Spot
  anchor: 'start' | 'middle' | 'end'
  label: string
}

/** A computed figure on a drawing, legible over lines. */
export const Figure = ({ at: { x, y }, anchor, label }: FigureProps) => (
  <text
    x={x}
    y={y}
    textAnchor={anchor}
    strokeWidth="4"
    paintOrder="stroke"
    className="fill-spruce stroke-card font-condensed text-sm font-semibold"
  >
    {label}
  </text>
)

export const Rect = ({ box, className }: { box: Box; className: string }) => (
  <rect {...box} className={className} strokeWidth="1.5" />
)
