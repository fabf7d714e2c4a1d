import type { Workbook } from 'exceljs'
import { CAUTION, type CutListDocument } from '../cut-list-document'
import { type CutListLine, cutListLines } from '../cut-list-lines'
import { lengthFormat, nearFormat, takeUpFormat } from '../length-format'
import { addTable, type SheetColumn } from './sheet'

export function addCutListSheet(workbook: Workbook, document: CutListDocument): void {
  const lines = cutListLines(document)
  addTable(workbook, document, {
    name: 'Cut list',
    columns: cutListColumns(document, lines),
    lines,
    group: ({ run }) => run,
    closing: [CAUTION],
  })
}

const feetColumn: SheetColumn<CutListLine> = {
  header: 'In feet and inches',
  value: ({ feet }) => feet,
  widest: 16,
}

function cutListColumns(document: CutListDocument, lines: CutListLine[]): SheetColumn<CutListLine>[] {
  const unit = document.units
  const takeUp = takeUpFormat(document)
  const exactly = (value: (line: CutListLine) => number | undefined): string =>
    lengthFormat(
      lines.map(value).filter((length) => length !== undefined),
      document,
    )
  const height = (line: CutListLine) => line.height
  const length = (line: CutListLine) => line.length
  return [
    { header: 'Run', value: ({ run }) => run, widest: 14 },
    { header: 'Cable', value: ({ cable }) => cable, widest: 6, format: '0' },
    { header: `Height (${unit})`, value: height, widest: 10, format: exactly(height) },
    { header: 'Mode', value: ({ mode }) => mode, widest: 8 },
    { header: `Cut or shop length (${unit})`, value: length, widest: 12, format: exactly(length) },
    ...(unit === 'in' ? [feetColumn] : []),
    {
      header: `Finish mark (${unit})`,
      value: ({ finish }) => finish,
      widest: 12,
      format: nearFormat(document),
    },
    { header: 'Cable type', value: ({ cableName }) => cableName, widest: 22, wrap: true },
    { header: 'Fitting from', value: ({ from }) => from, widest: 26, wrap: true },
    { header: 'Fitting to', value: ({ to }) => to, widest: 26, wrap: true },
    { header: `Planned take-up (${unit})`, value: ({ planned }) => planned, widest: 9, format: takeUp },
    { header: `Worst take-up (${unit})`, value: ({ worst }) => worst, widest: 9, format: takeUp },
    { header: `Limit (${unit})`, value: ({ limit }) => limit, widest: 9, format: takeUp },
    { header: 'Note', value: ({ note }) => note, widest: 48, wrap: true },
  ]
}
