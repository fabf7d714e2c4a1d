import { gapReadings } from '@shared/calculation/clear-length'
import { gapFindings } from '@shared/calculation/findings/reading-findings'
import { meanOfReadings } from '@shared/calculation/mean-of-readings'
import { writePhrase } from '@shared/calculation/phrase'
import type { Reading } from '@shared/schemas/bay'
import { NM_PER_FOOT } from '@shared/units/length'
import type { EditorView } from '../model/editor-context'

/** A whole foot off, to this much, is a misread tape. */
const NEAR_A_FOOT = NM_PER_FOOT / 24

/** Findings that these sentences stand for, so that a panel does not say them twice. */
export const doubtCodes: ReadonlySet<string> = new Set([
  'readings-differ',
  'post-out-of-plumb',
  'angle-differs',
])

/** What is odd about readings taken at one place of the tape or two, in sentences; nothing of it stops anybody. */
export function readingDoubts(
  readings: readonly Reading[],
  { rules, units }: Pick<EditorView, 'rules' | 'units'>,
): string[] {
  const notices = gapFindings(gapReadings(readings), { where: {}, name: 'this bay', rules })
  const foot = (['top', 'bottom'] as const).some((place) => isFootOff(readings, place))
  return [
    ...notices.map(({ phrase }) => writePhrase(phrase, units)),
    ...(foot ? ['Readings at one place lie near a whole foot apart: the tape was probably misread.'] : []),
  ]
}

function isFootOff(readings: readonly Reading[], place: Reading['at']): boolean {
  const read = meanOfReadings(readings, place)
  const spread = read ? read.greatest - read.least : 0
  const feet = Math.round(spread / NM_PER_FOOT)
  return feet > 0 && Math.abs(spread - feet * NM_PER_FOOT) < NEAR_A_FOOT
}
