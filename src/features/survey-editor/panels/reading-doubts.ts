import type { Reading } from '@shared/schemas/bay'
import { meanOfReadings } from '@shared/calculation/mean-of-readings'
import { writeLength } from '@shared/units/format-length'
import { NM_PER_FOOT } from '@shared/units/length'
import type { EditorView } from '../model/editor-context'
import { formatOf } from './format-of'

/** A whole foot off, to this much, is a misread tape. */
const NEAR_A_FOOT = NM_PER_FOOT / 24

/** What is odd about readings taken at one place of the tape or two, in sentences; nothing of it stops anybody. */
export function readingDoubts(
  readings: readonly Reading[],
  view: Pick<EditorView, 'rules' | 'units' | 'fraction'>,
): string[] {
  const { rules } = view
  const shown = (nm: number) => writeLength(nm, formatOf(view))
  const doubts: string[] = []
  for (const place of ['top', 'bottom'] as const) {
    const read = meanOfReadings(readings, place)
    const spread = read ? read.greatest - read.least : 0
    if (spread <= 3 * rules.readingLimit) continue
    const feet = Math.round(spread / NM_PER_FOOT)
    const footOff = feet > 0 && Math.abs(spread - feet * NM_PER_FOOT) < NEAR_A_FOOT
    doubts.push(
      `The ${place} readings differ by ${shown(spread)}${footOff ? ', near a whole foot' : ''}. Read again and strike the wrong one.`,
    )
  }
  const [top, bottom] = [meanOfReadings(readings, 'top'), meanOfReadings(readings, 'bottom')]
  if (top && bottom && Math.abs(top.mean - bottom.mean) > rules.plumbLimit) {
    doubts.push(
      `Top and bottom differ by ${shown(Math.abs(top.mean - bottom.mean))}: a post leans, or one of them was misread.`,
    )
  }
  return doubts
}
