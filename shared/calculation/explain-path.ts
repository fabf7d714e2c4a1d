import { toDegrees } from '../units/angle'
import type { BayPath } from './bay-path'
import type { CablePath, OverallPath, PathTerm } from './cable-path'
import type { GapReadings } from './clear-length'
import { holeHeights } from './hole-heights'
import type { Figure, Phrase } from './phrase'
import type { PostPath } from './post-path'
import type { LimitLine, WorkingLine } from './working'

/** The path of a cable, term by term. */
export const explainPath = ({ terms }: CablePath, height: number): WorkingLine[] =>
  terms.map((term, i) => ({
    label: [termName(term)],
    value: term.value,
    reason: [
      ...termReason(term, height),
      ...(term.kind === 'post' ? holesPhrase(term, [terms[i - 1], terms[i + 1]], height) : []),
    ],
  }))

function termName(term: PathTerm): string {
  if (term.kind === 'overall') return 'Overall reading'
  return term.kind === 'post' ? `Post ${term.post.post.id}` : `Bay ${term.bay.id}`
}

function termReason(term: PathTerm, height: number): Phrase {
  if (term.kind === 'post') return postReason(term)
  if (term.kind === 'overall')
    return ['End face to end face: ', ...readingsPhrase(term.readings, height, term.value)]
  return bayReason(term, height)
}

/** What was read, and how the cable's height lies between the places. */
function readingsPhrase({ top, bottom }: GapReadings, height: number, value: number): Phrase {
  const mean = (place: string, read: { mean: number; count: number }): Phrase => [
    ...(read.count > 1 ? [`the mean of ${read.count} readings, `] : []),
    { length: read.mean },
    ` at the ${place}`,
  ]
  if (top && bottom) {
    const places = [...mean('top', top), ' and ', ...mean('bottom', bottom)]
    return [...places, ' give ', { length: value }, ' at the cable’s height of ', { length: height }]
  }
  if (top) return [...mean('top', top), ', at every height']
  return bottom ? [...mean('bottom', bottom), ', at every height'] : []
}

function bayReason({ bay, readings, clear, angle, factor }: BayPath, height: number): Phrase {
  const read = readingsPhrase(readings, height, clear)
  if (bay.kind === 'level') return read
  const theta: Figure = { angle: toDegrees(angle.angle) }
  const from = angle.source === 'gauge' ? 'by the gauge' : 'from rise and going'
  if (bay.taped === 'slope')
    return [...read, '; taped along the slope of ', theta, ` (${from}), it counts as read`]
  return [
    ...read,
    '; taped level, it is divided by the cosine of ',
    theta,
    ` (${from}): times `,
    { number: factor },
  ]
}

function postReason({ post, size, factor }: PostPath): Phrase {
  const side = `its size ${post.side}${post.assumed ? ' (corner assumed square)' : ''}, `
  if (factor === 1) return ['passed square: ', side, { length: size }]
  return [
    'passed on a slope: ',
    side,
    { length: size },
    ', times ',
    { number: factor },
    ' (½ / cos before + ½ / cos after)',
  ]
}

/** Where the hole of a post on a stair is to be drilled: lower on the downhill face, higher on the other. */
function holesPhrase(
  { size }: PostPath,
  neighbours: readonly (PathTerm | undefined)[],
  height: number,
): Phrase {
  const bays = neighbours.flatMap((term) => (term?.kind === 'bay' ? [term] : []))
  const [before, after] = bays
  if (!before || !after || (before.angle.angle === 0 && after.angle.angle === 0)) return []
  if (before.angle.angle === after.angle.angle) {
    const { lower, upper } = holeHeights(height, size, before.angle.angle)
    return [
      '. Its hole’s centre lies at ',
      { length: lower },
      ' on the downhill face, at ',
      { length: upper },
      ' on the other',
    ]
  }
  const toward = ({ bay, angle }: BayPath): Phrase => {
    const off = height - holeHeights(height, size, angle.angle).lower
    return off === 0
      ? [`toward bay ${bay.id} level`]
      : [`toward bay ${bay.id} `, { length: off }, ' lower where that goes down, higher where it goes up']
  }
  return ['. Its hole’s centre lies ', ...toward(before), ', ', ...toward(after)]
}

/** The limits a path brings: one per reading, the tape's and the gauge's added up along the run. */
export function explainPathLimits({ terms, tapeLimit, angleLimit }: CablePath): LimitLine[] {
  const readings = terms.map((term): LimitLine => ({
    kind: 'reading',
    label: [term.kind === 'overall' ? 'Overall reading' : `Reading of ${termName(term).toLowerCase()}`],
    value: term.readingLimit,
    reason: readingLimitReason(term),
    onSite: false,
  }))
  const taped = terms.filter((term): term is BayPath | OverallPath => term.kind !== 'post')
  const angled = terms.filter((term): term is BayPath => term.kind === 'bay' && term.angleLimit > 0)
  const sum = (values: number[]): Phrase =>
    values.flatMap((value, i) => (i > 0 ? [' + ', { length: value }] : [{ length: value }]))
  const lines: LimitLine[] = [...readings]
  if (tapeLimit > 0) {
    const reason = ['one tape, so its limits add up: ', ...sum(taped.map((term) => term.tapeLimit))]
    lines.push({ kind: 'tape', label: ['Tape'], value: tapeLimit, reason, onSite: false })
  }
  if (angleLimit > 0) {
    const reason = [`${angleSources(angled)}: `, ...sum(angled.map((term) => term.angleLimit))]
    lines.push({ kind: 'angle', label: ['Angle'], value: angleLimit, reason, onSite: false })
  }
  return lines
}

/** What the angles were taken with: all errors are taken to fall one way. */
function angleSources(angled: readonly BayPath[]): string {
  const gauged = angled.filter(({ angle }) => angle.source === 'gauge').length
  if (gauged === angled.length) return 'one gauge, so its limits add up'
  const what = gauged === 0 ? 'angles from rise and going' : 'angles from gauge and from rise and going'
  return angled.length === 1 ? 'the angle from rise and going' : `${what}, whose limits add up along the run`
}

function readingLimitReason(term: PathTerm): Phrase {
  const count = term.kind === 'post' ? 1 : term.count
  const factor = term.kind === 'overall' ? 1 : term.factor
  const phrase: (string | Figure)[] = ['the house’s limit of one reading']
  if (count > 1) phrase.push(` over √${count}, for ${count} readings`)
  if (factor !== 1) phrase.push(', times ', { number: factor }, ' for the slope')
  return phrase
}
