import type { CornerCheck } from '@shared/calculation/checks/check-corners'
import { type LengthFormat, writeLength } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { Computed } from './computed'
import type { CheckContext } from './context'
import { Dimension, Rect } from './dimension'
import { type FigureLine, FigureList } from './figure-list'
import { sectionShape, staggerShape } from './section-shape'
import { SectionPicture } from './section-picture'
import { foundAt, verdictOf } from './verdict'

const SIDE = 240

/** Two runs that end at one post: their holes in section, and the stagger that keeps them apart. */
export function CornerSection({ corner, context }: { corner: CornerCheck; context: CheckContext }) {
  const { post, a, b, kind, stagger } = corner
  const { format } = context
  return (
    <section aria-label={`Corner ${post}, runs ${a.run} and ${b.run}`} className="flex flex-col gap-3">
      <h3 className="font-semibold">
        Post {post}: runs {a.run} and {b.run} {kind === 'turned' ? 'at a corner' : 'end to end'}
      </h3>
      <div className="grid items-start gap-4 lg:grid-cols-2">
        <div className="flex flex-wrap items-start gap-4">
          <CornerPicture corner={corner} format={format} />
          {stagger > 0 ? <StaggerStrip corner={corner} format={format} /> : null}
        </div>
        <FigureList lines={cornerLines(corner, context)} />
      </div>
    </section>
  )
}

function CornerPicture({ corner, format }: { corner: CornerCheck; format: LengthFormat }) {
  const { post, kind, a, b, along, across, overlap } = corner
  const write = (value: number) => writeLength(value, format)
  const meeting =
    overlap > 0 ? `they overlap by ${write(overlap)}` : `${write(-overlap)} of wood stay between them`
  const shape = sectionShape(
    { along, across, cover: a.post.post.cover ?? 0 },
    [
      { fitting: a.fitting, face: 'left' },
      { fitting: b.fitting, face: kind === 'turned' ? 'near' : 'right' },
    ],
    SIDE,
  )
  return (
    <SectionPicture
      shape={shape}
      names={[a.run, b.run]}
      said={`Post ${post} cut level, to scale: at one height the hole of run ${a.run} is ${write(a.fitting.body)} deep, that of run ${b.run} ${write(b.fitting.body)}; ${meeting}.`}
    />
  )
}

/** The face of the post with both holes set apart in height. */
function StaggerStrip({ corner, format }: { corner: CornerCheck; format: LengthFormat }) {
  const { a, b, post, stagger } = corner
  const shape = staggerShape(corner, SIDE)
  const needed = writeLength(stagger, format)
  const round = {
    cx: shape.b.x + shape.b.width / 2,
    cy: shape.b.y + shape.b.height / 2,
    r: shape.b.height / 2,
  }
  const { round: isRound, ...box } = shape.b
  return (
    <svg
      role="img"
      aria-label={`The face of post ${post}, to scale: the holes of runs ${a.run} and ${b.run} at least ${needed} apart in height, centre to centre.`}
      viewBox={`0 0 ${shape.width} ${shape.height.toFixed(2)}`}
      className="w-full max-w-72 rounded border border-rule bg-card"
    >
      <Rect box={shape.face} className="fill-rule stroke-ink print:fill-paper" />
      <Rect box={shape.a} className="fill-none stroke-spruce [stroke-dasharray:4_3]" />
      {isRound ? (
        <circle {...round} className="fill-card stroke-chalk print:stroke-ink" strokeWidth="1.5" />
      ) : (
        <Rect box={box} className="fill-none stroke-chalk [stroke-dasharray:4_3] print:stroke-ink" />
      )}
      <Name x={shape.a.x + 6} y={shape.a.y + shape.a.height + 14} text={a.run} className="fill-spruce" />
      <Name
        x={shape.b.x + shape.b.width + 5}
        y={shape.b.y + shape.b.height / 2 + 4.5}
        text={isRound ? b.run : ''}
        className="fill-chalk print:fill-ink"
      />
      <Dimension line={shape.apart} label={needed} at={shape.label} />
    </svg>
  )
}

interface NameProps {
  x: number
  y: number
  text: string
  className: string
}

const Name = ({ x, y, text, className }: NameProps) => (
  <text x={x} y={y} className={`${className} font-condensed text-sm font-semibold`}>
    {text}
  </text>
)

/** Thinner than this nothing is seen, nm. */
const TOUCHING = 1e5

function cornerLines(corner: CornerCheck, { checks, rules, format }: CheckContext): FigureLine[] {
  const { overlap, stagger, apart, kind, post, b } = corner
  const found = foundAt(checks.findings, { run: b.run, post })
  const turned = kind === 'turned'
  return [
    {
      label:
        overlap > TOUCHING ? 'Overlap of the holes at one height' : 'Wood between the holes at one height',
      value:
        Math.abs(overlap) <= TOUCHING ? (
          'none: they touch'
        ) : (
          <Computed value={Math.abs(overlap)} format={format} />
        ),
      note: turned ? (
        <>
          an overlap of at most <Length value={rules.cornerOverlap} format={format} />: the house rules
        </>
      ) : (
        <>
          at least <Length value={rules.cornerWeb} format={format} /> of wood: the house rules
        </>
      ),
      verdict: stagger === 0 ? 'holds' : undefined,
    },
    {
      label: 'Stagger needed',
      value: stagger === 0 ? 'none' : <Computed value={stagger} format={format} />,
      note:
        stagger === 0 ? undefined : (
          <>
            {Number.isFinite(apart) ? (
              <>
                The holes are <Length value={apart} format={format} /> apart in height.{' '}
              </>
            ) : null}
            Set one run at least <Length value={stagger} format={format} /> higher or lower, which leaves{' '}
            <Length value={rules.cornerWeb} format={format} /> of wood between them, or choose shorter bodies.
          </>
        ),
      verdict: stagger === 0 ? undefined : verdictOf(found, 'corner-overlap', 'bodies-meet'),
    },
  ]
}
