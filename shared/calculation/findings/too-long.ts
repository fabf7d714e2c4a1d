import type { Course } from '../course'
import { figureRun, type RunFigures } from '../figure-run'
import type { SurveyIndex } from '../survey-index'
import { cableNumbers, type Notice } from './notice'

/** A run too long for its fittings, with the through post where ending it would mend that. */
export function tooLongFindings(index: SurveyIndex, figures: RunFigures): Notice[] {
  const long = figures.cables.filter(({ why }) => why === 'too-long')
  const [first] = long
  if (!first?.own || !first.problem) return []
  const { course } = figures
  const post = mendingPost(index, course)
  return [
    {
      level: 'stop',
      code: 'too-long',
      where: { run: course.run.id, ...(post === undefined ? {} : { post }) },
      phrase: [
        `Run ${course.run.id}: ${cableNumbers(long.map(({ number }) => number))}, `,
        { length: first.problem.path },
        ' long, cannot be tensioned over more than ',
        { length: first.own.longest },
        post === undefined
          ? '. End the run at more posts, or use fittings with more take-up.'
          : `. End the run at post ${post}.`,
      ],
    },
  ]
}

/** The post passed where both halves are within their longest; of several, the one that halves the run best. */
export function mendingPost(index: SurveyIndex, course: Course): string | undefined {
  let best: { post: string; longer: number } | undefined
  for (const [i, { post }] of course.posts.slice(1, -1).entries()) {
    const halves = [part(course, 0, i + 1), part(course, i + 1, course.legs.length)]
    const lengths = halves.map((half) => longestPath(figureRun(index, half)))
    const longer = Math.max(...lengths)
    if (longer < (best?.longer ?? Infinity)) best = { post: post.id, longer }
  }
  return best?.post
}

/** Part of a run; overall readings say nothing of it. */
const part = (course: Course, from: number, to: number): Course => ({
  ...course,
  legs: course.legs.slice(from, to),
  posts: course.posts.slice(from, to + 1),
  overall: {},
})

/** D of the longest cable; Infinity when one of them cannot be cut. */
function longestPath(figures: RunFigures | undefined): number {
  if (!figures || figures.cables.length === 0) return Infinity
  return Math.max(
    ...figures.cables.map(({ cut, path }) =>
      !cut || cut.mode === 'none' ? Infinity : (path?.length ?? Infinity),
    ),
  )
}
