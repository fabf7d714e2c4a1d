import type { Length } from '@shared/units/length'
import { parseLength } from '@shared/units/parse-length'
import { lengthFault } from '../panels/length-bounds'

/** One pasted line and the row it is for. */
export interface PastedLine {
  /** Id of the row. */
  row: string
  text: string
  length?: Length
  /** Why it was not understood; such a line is left out. */
  fault?: string
}

/** A pasted column read as lengths, one for each row from the one pasted into; empty lines skip their row. */
export function readPasted(
  lines: readonly string[],
  rows: readonly string[],
  house: 'in' | 'mm',
): PastedLine[] {
  return lines.flatMap((line, i): PastedLine[] => {
    const text = line.trim()
    if (text === '') return []
    const row = rows[i]
    if (row === undefined) return [{ row: '', text, fault: 'There is no row left for this line.' }]
    const parsed = parseLength(text, { default: house })
    if (!parsed.ok) return [{ row, text, fault: parsed.message }]
    const fault = lengthFault(parsed.length)
    return [fault === undefined ? { row, text, length: parsed.length } : { row, text, fault }]
  })
}
