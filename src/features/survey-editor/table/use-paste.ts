import type { ReadingPlace } from '@shared/schemas/bay'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import type { EditorActions, EditorView } from '../model/editor-context'
import { newReading } from '../panels/new-reading'
import { oneGesture } from '../tools/one-gesture'
import { type PastedLine, readPasted } from './paste'

/** A column that was pasted, and where it is to go from which row on. */
export interface Paste {
  target: { kind: 'size'; column: 'along' | 'across' | 'cover' } | { kind: 'reading'; place: ReadingPlace }
  row: string
  lines: string[]
}

/** The pasted column read for its rows, and its taking over as one gesture. */
export function usePaste(view: EditorView, actions: EditorActions, paste: Paste | null) {
  const lines = paste ? linesOf(view, paste) : []
  const apply = () => {
    if (!paste) return
    const operations = lines.flatMap((line) => operationOf(view, paste, line))
    if (operations.length > 0) actions.perform(oneGesture(operations))
  }
  return { lines, apply }
}

function linesOf({ survey, units }: EditorView, { target, row, lines }: Paste): PastedLine[] {
  const ids = (target.kind === 'size' ? survey.posts : survey.bays).map(({ id }) => id)
  return readPasted(lines, ids.slice(Math.max(0, ids.indexOf(row))), units.length)
}

function operationOf(view: EditorView, { target }: Paste, { row, length }: PastedLine): SurveyOperation[] {
  if (length === undefined || length <= 0) return []
  if (target.kind === 'size')
    return [{ type: 'post.set', id: row, set: { [target.column]: length }, unset: [] }]
  const reading = newReading({ at: target.place, value: length, by: view.person.name })
  return [{ type: 'reading.add', of: { kind: 'bay', id: row }, reading }]
}
