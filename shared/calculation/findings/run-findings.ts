import { overallPath, type PathContext, summedPath } from '../cable-path'
import { type Closure, closure } from '../closure'
import { pitchChanges, type RunFigures } from '../figure-run'
import { exceeds } from '../round-to-step'
import type { SurveyIndex } from '../survey-index'
import { missingFindings } from './missing-findings'
import type { Notice } from './notice'
import { gapFindings } from './reading-findings'
import { tooLongFindings } from './too-long'

const ANGLE_NOISE = 1e-9

/** Everything noticed about a run, each once however many cables it bears on. */
export function runFindings(index: SurveyIndex, figures: RunFigures): Notice[] {
  const { course } = figures
  const { rules } = index
  const run = course.run.id
  return [
    ...gapFindings(course.overall, { where: { run }, name: `run ${run} overall`, rules }),
    ...missingFindings(figures),
    ...assumedCorners(figures),
    ...closureFindings(figures, { readAt: index.survey.guard.readAt, rules }),
    ...pitchFindings(figures, rules.maxBend),
    ...tooLongFindings(index, figures),
  ]
}

function closureFindings({ course, cables }: RunFigures, context: PathContext): Notice[] {
  let worst: Closure | undefined
  for (const { height } of cables) {
    const overall = overallPath(course.overall, height, context)
    const summed = overall && summedPath(course, height, context)
    if (!summed) return []
    const found = closure(overall, summed)
    if (!exceeds(Math.abs(found.gap), found.limit)) continue
    if (!worst || Math.abs(found.gap) > Math.abs(worst.gap)) worst = found
  }
  if (!worst) return []
  return [
    {
      level: 'check',
      code: 'closure',
      where: { run: course.run.id },
      phrase: [
        `Run ${course.run.id}: the overall reading is `,
        { length: Math.abs(worst.gap) },
        ` ${worst.gap > 0 ? 'longer' : 'shorter'} than its bays and posts together, more than the `,
        { length: worst.limit },
        ' that readings may differ by. Read the overall and the bays again.',
      ],
    },
  ]
}

function pitchFindings({ course }: RunFigures, maxBend: number): Notice[] {
  return pitchChanges(course)
    .filter(({ change }) => change > maxBend + ANGLE_NOISE)
    .map(({ post, change }) => ({
      level: 'check',
      code: 'pitch-changes',
      where: { run: course.run.id, post },
      phrase: [
        `Run ${course.run.id} changes its pitch by `,
        { angle: change },
        ` at post ${post}: end the run here or protect the bend.`,
      ],
    }))
}

/** A corner assumed square matters only where the post is not square itself. */
function assumedCorners({ course }: RunFigures): Notice[] {
  return course.posts
    .filter(({ post, assumed }) => assumed && post.along !== post.across)
    .map(({ post, side }) => ({
      level: 'note',
      code: 'corner-assumed',
      where: { run: course.run.id, post: post.id },
      phrase: [
        `Run ${course.run.id}: the corner at post ${post.id} is assumed square, so its size ${side} is used.`,
      ],
    }))
}
