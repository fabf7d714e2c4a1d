import type { CornerCheck } from '@shared/calculation/checks/check-corners'
import type { PostCheck, Support, SupportAnswer } from '@shared/calculation/checks/check-post'
import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { CornerPicture } from './corner-picture'
import { type FigureLine, FigureList } from './figure-list'
import type { Figures } from './figures'

interface PostSectionProps {
  post: PostCheck
  /** The codes of what was found of this post. */
  found: ReadonlySet<string>
  format: LengthFormat
  figures: Figures
}

const supportWords: Record<Support, string> = { propped: 'Held by the top rail', cantilever: 'Standing free' }

/** The post at one end of a run: what pulls at it and what it may take. */
export function PostSection({ post, found, format, figures }: PostSectionProps) {
  const counting = post.support ?? 'cantilever'
  const over = found.has('post-overstressed')
  const answerLine = (support: Support, answer: SupportAnswer): FigureLine => ({
    label: `${supportWords[support]}${support === counting ? (post.support ? '' : ', taken since nobody said') : ', for comparison'}`,
    value: answer.stress === undefined ? figures.moment(answer.moment) : figures.stress(answer.stress),
    note: `moment ${figures.moment(answer.moment)}${
      answer.deflection === undefined ? '' : `, gives way ${deflectionText(answer.deflection, format)}`
    }`,
    level: support === counting && over ? 'check' : undefined,
  })
  const { allowable } = post
  const lines: FigureLine[] = [
    { label: 'Pull of all cables', value: figures.force(post.pull) },
    answerLine('propped', post.propped),
    answerLine('cantilever', post.cantilever),
    allowable
      ? {
          label: 'Allowed in bending',
          value: figures.stress(allowable.stress),
          note: `${allowable.lumber.name}: Fb ${figures.stress(allowable.lumber.bending)} × size factor ${allowable.lumber.sizeFactor} × wet factor ${allowable.wetFactor}; all others are the engineer’s`,
        }
      : { label: 'Allowed in bending', value: 'ask the engineer', note: `core: ${post.core ?? 'not noted'}` },
    ...(post.topLoad
      ? [
          {
            label: `${figures.force(post.topLoad.force)} at the top, standing free`,
            value: figures.stress(post.topLoad.stress, figures.moment(post.topLoad.moment)),
            level: found.has('post-top-load') ? ('check' as const) : undefined,
          },
        ]
      : []),
    ...(post.backLeft === undefined
      ? []
      : [
          {
            label: 'Wood behind the fitting',
            value: <Length value={post.backLeft} format={format} look="computed" />,
          },
        ]),
    ...(post.edgeLeft === undefined
      ? []
      : [
          {
            label: 'Wood beside the hole, each side',
            value: <Length value={post.edgeLeft} format={format} look="computed" />,
            level: found.has('edge-thin') ? ('check' as const) : undefined,
          },
        ]),
  ]
  return (
    <section aria-label={`Post ${post.post}`} className="flex flex-col gap-2">
      <h3 className="font-semibold">
        Post {post.post}
        {post.fitting ? `, ${post.fitting.name}` : ''}
      </h3>
      <FigureList lines={lines} />
    </section>
  )
}

/** mm to the survey's units. */
const deflectionText = (millimetres: number, { style }: LengthFormat): string =>
  style === 'millimetres' ? `${millimetres.toFixed(1)} mm` : `${(millimetres / 25.4).toFixed(3)}″`

/** Two runs that end at one post: their holes in section, and the stagger that keeps them apart. */
export function CornerSection({ corner, format }: { corner: CornerCheck; format: LengthFormat }) {
  const { post, a, b, overlap, stagger, apart } = corner
  const cured = stagger > 0 && apart >= stagger - 1
  return (
    <section aria-label={`Corner ${post}`} className="flex flex-col gap-2">
      <h3 className="font-semibold">
        Post {post}: runs {a.run} and {b.run} {corner.kind === 'turned' ? 'at a corner' : 'end to end'}
      </h3>
      <div className="grid gap-4 lg:grid-cols-2">
        <CornerPicture corner={corner} format={format} />
        <FigureList
          lines={[
            {
              label: overlap > 0 ? 'Holes at one height overlap by' : 'Wood between the holes at one height',
              value: <Length value={Math.abs(overlap)} format={format} look="computed" />,
            },
            {
              label: 'Stagger needed',
              value: stagger === 0 ? 'none' : <Length value={stagger} format={format} look="computed" />,
              note:
                stagger === 0 ? undefined : (
                  <>
                    they are <Length value={apart} format={format} /> apart{cured ? ', which is enough' : ''}
                  </>
                ),
              level: stagger > 0 && !cured ? 'stop' : undefined,
            },
          ]}
        />
      </div>
    </section>
  )
}
