import type { CableFigures, RunFigures } from '../figure-run'
import { passedOverPhrase } from '../fitting-phrases'
import type { Missing } from '../missing-readings'
import type { Phrase } from '../phrase'
import { needsSize, type RunEnd } from '../run-ends'
import { cableNumbers, type Notice } from './notice'

/** What stops a run from being computed at all. */
export function missingFindings(figures: RunFigures): Notice[] {
  const { course, missing, ends, heights } = figures
  const run = course.run.id
  const notices = missing.map((item) => missingNotice(item, run))
  if (!course.cable) {
    notices.push({
      level: 'stop',
      code: 'cable-unknown',
      where: { run },
      phrase: [`Run ${run}: the hardware has no cable ${course.run.cable}. Choose another cable, or add it.`],
    })
  }
  if (heights.heights.length === 0) {
    notices.push({
      level: 'stop',
      code: 'no-cables',
      where: { run },
      phrase: [
        `Run ${run}: no cable fits between `,
        { length: figures.opening.bottom },
        ' and ',
        { length: figures.opening.top },
        '. Check the spacing and the guard’s heights.',
      ],
    })
  }
  for (const end of [ends.from, ends.to]) notices.push(...endNotices(end, figures))
  return [...notices, ...impossibleNotices(figures)]
}

function missingNotice(missing: Missing, run: string): Notice {
  if (missing.what === 'size') {
    const { post, side } = missing
    const phrase = [`Run ${run}: the size of post ${post} ${side} is missing. Measure it, over its cover.`]
    return { level: 'stop', code: 'missing-size', where: { run, post }, phrase }
  }
  const { bay } = missing
  const where = { run, bay }
  return missing.what === 'reading'
    ? {
        level: 'stop',
        code: 'missing-reading',
        where,
        phrase: [`Run ${run}: bay ${bay} has no reading. Tape it, best at the top and at the bottom.`],
      }
    : {
        level: 'stop',
        code: 'missing-angle',
        where,
        phrase: [`Run ${run}: stair ${bay} has no angle. Measure rise and going, or read the gauge.`],
      }
}

function endNotices(end: RunEnd, { course }: RunFigures): Notice[] {
  const { post } = end.post
  const where = { run: course.run.id, post: post.id }
  if (!post.material) {
    const phrase = [
      `Run ${course.run.id}: the material of post ${post.id} is missing, so no fitting can be chosen.`,
    ]
    return [{ level: 'stop', code: 'missing-material', where, phrase }]
  }
  const notices: Notice[] = []
  if (post.material === 'veneered' && post.cover === undefined) {
    const phrase = [`Post ${post.id} is veneered, but its cover was not measured; none is reckoned with.`]
    notices.push({ level: 'check', code: 'missing-cover', where: { post: post.id }, phrase })
  }
  if (end.choice && !end.choice.chosen && !needsSize(end)) notices.push(noFitting(end, course.run.id))
  return notices
}

/** A catalogue may be long; the working lists every fitting. */
const MOST_REASONS = 4

function noFitting({ post: { post }, choice }: RunEnd, run: string): Notice {
  const reasons = (choice?.passedOver ?? []).filter(({ reason }) => reason.because !== 'material')
  const listed = reasons
    .slice(0, MOST_REASONS)
    .flatMap(({ fitting, reason }): Phrase => [` ${fitting.name}: `, ...passedOverPhrase(reason), '.'])
  if (reasons.length > MOST_REASONS) listed.push(` So too ${reasons.length - MOST_REASONS} more.`)
  if (reasons.length === 0) listed.push(` No fitting of the hardware is made for ${post.material} posts.`)
  const phrase = [`Run ${run}: no fitting suits post ${post.id}.`, ...listed]
  return { level: 'stop', code: 'no-fitting', where: { run, post: post.id }, phrase }
}

function impossibleNotices({ course: { run }, cables }: RunFigures): Notice[] {
  const numbers = (kind: CableFigures['impossible']) =>
    cables.flatMap(({ number, impossible }) => (impossible === kind ? [number] : []))
  const [readings, room] = [numbers('readings'), numbers('room')]
  const where = { run: run.id }
  const notices: Notice[] = []
  if (readings.length > 0) {
    const phrase = [
      `Run ${run.id}: the readings leave no length for ${cableNumbers(readings)}. Read the bays again.`,
    ]
    notices.push({ level: 'stop', code: 'impossible-readings', where, phrase })
  }
  if (room.length > 0) {
    const phrase = [`Run ${run.id}: the fittings leave no room for ${cableNumbers(room)} between the posts.`]
    notices.push({ level: 'stop', code: 'no-room', where, phrase })
  }
  return notices
}
