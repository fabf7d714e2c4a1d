import type { ReadingPlace } from '@shared/schemas/bay'
import type { ReadingOwner, SimpleOperation, SurveyOperation } from '@shared/survey/survey-operation'
import { inches } from '@shared/units/length'
import { demoRectangle } from './demo-rectangle'
import type { DemoTruth } from './demo-truth'

export interface DemoVisit {
  truth: DemoTruth
  /** Id of the stored photo inside the survey, and its name. */
  photo: { id: string; file: string }
  /** The visit ended early: bays from this one on were not read, and this post’s material was not noted. */
  stoppedAt?: { bay: number; post: string }
  /** Cable id in the catalogue. */
  cable: string
}

/** What a surveyor did on site, gesture by gesture, made of a picture's truth. */
export function demoVisit(visit: DemoVisit): SurveyOperation[] {
  return [
    ...guardOperations(visit.truth),
    ...photoOperations(visit),
    ...visit.truth.posts.map((post) => postGesture(visit, post)),
    ...bayOperations(visit),
    ...readingOperations(visit),
    ...cornerOperations(visit.truth),
    ...runOperations(visit),
  ]
}

const photoOperations = ({ truth, photo: { id, file } }: DemoVisit): SimpleOperation[] => [
  { type: 'photo.add', photo: { id, file, posts: {} } },
  { type: 'photo.setRectangle', photo: id, rectangle: demoRectangle(truth) },
]

/** A stroke along the post puts it, its mark and what it is of. */
function postGesture({ photo, stoppedAt }: DemoVisit, post: DemoTruth['posts'][number]): SurveyOperation {
  const { id, material, sizeAlong, sizeAcross, basePx, topPx } = post
  const size = { along: inches(sizeAlong), across: inches(sizeAcross) }
  return {
    type: 'group',
    operations: [
      { type: 'post.add', post: { id, ...(stoppedAt?.post === id ? {} : { material }), ...size } },
      { type: 'photo.mark', photo: photo.id, post: id, mark: { base: basePx, top: topPx } },
    ],
  }
}

const bayId = (index: number): string => `B${index + 1}`

function bayOperations({ truth: { taped } }: DemoVisit): SimpleOperation[] {
  return taped.bays.map(({ from, to, kind }, i): SimpleOperation => {
    const plain = { id: bayId(i), from, to, kind, spacers: 0, skewFrom: 0, skewTo: 0, readings: [] }
    if (kind === 'level' || !taped.stair) return { type: 'bay.add', bay: { ...plain, taped: 'slope' } }
    const { rise, going } = taped.stair
    // Read with a level tape, as the truth's figures are; rise and going are those of one step.
    const stair = { taped: 'level' as const, rise: inches(rise.in), going: inches(going.in) }
    return { type: 'bay.add', bay: { ...plain, ...stair } }
  })
}

/** Bottom first, then top, a minute after the other bay, beginning when the photo was taken. */
function readingOperations({ truth: { taped, exif }, stoppedAt }: DemoVisit): SimpleOperation[] {
  const read = taped.bays.slice(0, stoppedAt?.bay)
  return read.flatMap(({ bottom, top }, i) => {
    const on = minutesAfter(exif.DateTimeOriginal, i + 1)
    return readingPair({ kind: 'bay', id: bayId(i) }, { bottom: bottom.in, top: top.in, on })
  })
}

function readingPair(
  of: ReadingOwner,
  { on, ...figures }: Record<ReadingPlace, number> & { on: string },
): SimpleOperation[] {
  return (['bottom', 'top'] as const).map((at, i) => ({
    type: 'reading.add',
    of,
    reading: { id: `r${i + 1}`, at, value: inches(figures[at]), on },
  }))
}

/** `2026:05:14 09:42:17` as cameras write it; the demo’s clock is taken to be that of Greenwich. */
function minutesAfter(written: string, minutes: number): string {
  const [day = '', time = ''] = written.split(' ')
  return new Date(Date.parse(`${day.replaceAll(':', '-')}T${time}Z`) + minutes * 60_000).toISOString()
}

/** A corner is read to half a degree; diagonals are read arris to arris and written centre to centre. */
function cornerOperations({ corners, diagonals, taped }: DemoTruth): SimpleOperation[] {
  const between = diagonals.flatMap(({ from, to, length, centreToCentre }): SimpleOperation[] => {
    const read = taped.diagonals.find((diagonal) => diagonal.from === from && diagonal.to === to)
    if (!read || centreToCentre === undefined) return []
    const value = inches(Math.round((read.length.in + centreToCentre - length) * 16) / 16)
    return [{ type: 'diagonal.add', diagonal: { id: `D-${from}-${to}`, from, to, value } }]
  })
  return [
    ...corners.map(({ post, angleDeg }) => ({
      type: 'corner.set' as const,
      corner: { post, angle: Math.round(angleDeg * 2) / 2 },
    })),
    ...between,
  ]
}

function runOperations({ truth, cable, stoppedAt }: DemoVisit): SimpleOperation[] {
  return truth.runs.flatMap((run, i): SimpleOperation[] => {
    const id = `R${i + 1}`
    const bays = truth.taped.bays.flatMap(({ from, to }, n) =>
      run.posts.includes(from) && run.posts.includes(to) ? [bayId(n)] : [],
    )
    const add: SimpleOperation = {
      type: 'run.add',
      run: { id, bays, cable, readings: [], cables: { layout: 'even', spacing: inches(3) } },
    }
    const level = truth.taped.bays.every(({ kind }) => kind === 'level')
    const overall = truth.taped.overall.find((reading) => reading.run === run.id)
    if (stoppedAt || !level || bays.length < 2 || !overall) return [add]
    const figures = { bottom: overall.innerBottom.in, top: overall.innerTop.in }
    const on = minutesAfter(truth.exif.DateTimeOriginal, 30 + i)
    return [add, ...readingPair({ kind: 'run', id }, { ...figures, on })]
  })
}

/** On a stair the guard stands lower, above the nosing line (IRC R312.1.2, exception 1). */
const guardOperations = ({ taped, deckZ }: DemoTruth): SimpleOperation[] => [
  {
    type: 'guard.set',
    set: {
      fall: inches(deckZ),
      railTies: true,
      ...(taped.stair ? { stair: { height: inches(34), topRailUnderside: inches(32.5) } } : {}),
    },
    unset: [],
  },
]
