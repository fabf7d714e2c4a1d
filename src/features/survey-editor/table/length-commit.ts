import type { Length } from '@shared/units/length'
import { parseLength } from '@shared/units/parse-length'
import type { EditorView } from '../model/editor-context'
import { type Least, lengthFault } from '../panels/length-bounds'

/** Reads a cell's text as a length and hands it on; an emptied cell hands on nothing. Answers what was not understood. */
export const lengthCommit =
  ({ units }: Pick<EditorView, 'units'>, keep: (value: Length | undefined) => void, least?: Least) =>
  (text: string): string | undefined => {
    if (text === '') {
      keep(undefined)
      return undefined
    }
    const parsed = parseLength(text, { default: units.length })
    if (!parsed.ok) return parsed.message
    const fault = lengthFault(parsed.length, least)
    if (fault === undefined) keep(parsed.length)
    return fault
  }

/** Reads a cell's text as a number within bounds. */
export const numberCommit =
  ([least, most]: readonly [number, number], keep: (value: number | undefined) => void) =>
  (text: string): string | undefined => {
    if (text === '') {
      keep(undefined)
      return undefined
    }
    const number = Number(text.replace(',', '.'))
    if (!Number.isFinite(number) || number < least || number > most)
      return `Write a number from ${least} to ${most}.`
    keep(number)
    return undefined
  }
