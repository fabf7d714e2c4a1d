import type { PostCheck } from '@shared/calculation/checks/check-post'
import type { Post } from '@shared/schemas/post'
import { type LengthFormat, writeLength } from '@shared/units/format-length'
import type { CheckContext } from './context'
import { FigureList } from './figure-list'
import { postCut } from './post-cut'
import { postLines } from './post-lines'
import { sectionShape } from './section-shape'
import { SectionPicture } from './section-picture'

const SIDE = 240

interface PostSectionProps {
  check: PostCheck
  /** As the survey has it. */
  post: Post | undefined
  context: CheckContext
}

/** The post at one end of a run: cut at the cable's height, what pulls at it and what it may take. */
export function PostSection({ check, post, context }: PostSectionProps) {
  return (
    <section aria-label={`Post ${check.post}, run ${check.run}`} className="flex min-w-0 flex-col gap-3">
      <h3 className="font-semibold">
        Post {check.post}
        {check.fitting ? `, ${check.fitting.name}` : ''}
      </h3>
      {post ? <PostPicture check={check} post={post} format={context.format} /> : null}
      <FigureList lines={postLines(check, context)} />
    </section>
  )
}

/** Nothing to draw without a fitting or a size. */
function PostPicture({ check, post, format }: { check: PostCheck; post: Post; format: LengthFormat }) {
  const cut = postCut(check, post)
  const { fitting, backLeft, edgeLeft } = check
  if (!cut || !fitting) return null
  const write = (value: number | undefined) => (value === undefined ? undefined : writeLength(value, format))
  const drilled = fitting.mount === 'drilled'
  const said = [
    `Post ${check.post} cut level at the cable’s height, to scale: ${writeLength(cut.along, format)} by ${writeLength(cut.across, format)}`,
    cut.cover > 0 ? `, with ${writeLength(cut.cover, format)} of cover around the core` : '',
    drilled ? `; a body of ${writeLength(fitting.body, format)}` : '; the fitting sits on its face',
    drilled ? ` in a hole of ${write(fitting.hole) ?? 'unknown width'}` : '',
    backLeft === undefined ? '' : `, ${writeLength(backLeft, format)} left behind it`,
    edgeLeft === undefined ? '' : ` and ${writeLength(edgeLeft, format)} of core on each side`,
    '.',
  ].join('')
  return (
    <SectionPicture
      shape={sectionShape(cut, [{ fitting, face: 'left' }], SIDE)}
      said={said}
      back={write(backLeft)}
      edge={write(edgeLeft)}
    />
  )
}
