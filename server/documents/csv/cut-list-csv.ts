import { stringify } from 'csv-stringify/sync'
import type { CutListDocument } from '../cut-list-document'
import { type CutListLine, cutListLines } from '../cut-list-lines'
import { safeText } from '../safe-text'

/**
 * The cut list as comma-separated values by RFC 4180: CRLF, a header line, quotes where needed. UTF-8 with a byte order
 * mark, since spreadsheets otherwise open it in the machine's old code page. Lengths are plain decimals in the unit
 * their header names.
 */
export function cutListCsv(document: CutListDocument): string {
  const { units, jobNumber, surveyTitle } = document
  const header = [
    'job',
    'survey',
    'run',
    'cable',
    `height_${units}`,
    'mode',
    `cut_or_shop_length_${units}`,
    `finish_mark_${units}`,
    'cable_type',
    'fitting_from',
    'fitting_to',
    `planned_take_up_${units}`,
    `worst_take_up_${units}`,
    `limit_${units}`,
    'note',
  ]
  const records = cutListLines(document).map((line) => [jobNumber, surveyTitle, ...fields(line)])
  return stringify([header, ...records.map((record) => record.map(cell))], {
    bom: true,
    record_delimiter: 'windows',
  })
}

const fields = (line: CutListLine): (string | number | undefined)[] => [
  line.run,
  line.cable,
  line.height,
  line.mode,
  line.length,
  line.finish,
  line.cableName,
  line.from,
  line.to,
  line.planned,
  line.worst,
  line.limit,
  line.note,
]

/** Six places of an inch or a millimetre are far below what any tool can cut. */
const cell = (value: string | number | undefined): string => {
  if (value === undefined) return ''
  return typeof value === 'number' ? String(Number(value.toFixed(6))) : safeText(value)
}
