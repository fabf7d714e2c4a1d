import type { Alignment, Border, Column, Workbook, Worksheet } from 'exceljs'
import { type CutListDocument, SHORT_CAUTION } from '../cut-list-document'
import { safeText, writableText } from '../safe-text'

export type CellValue = string | number | undefined

export interface SheetColumn<Line> {
  header: string
  value: (line: Line) => CellValue
  /** Width bounds in characters; the drawn width fits what is written. */
  widest: number
  format?: string
  wrap?: boolean
}

interface Table<Line> {
  name: string
  columns: SheetColumn<Line>[]
  lines: readonly Line[]
  /** Lines where this changes get a rule above them. */
  group?: (line: Line) => string
  /** Stands under the table. */
  closing?: string[]
}

const FONT = { name: 'Calibri', size: 11 }
const HEADER_FILL = { type: 'pattern', pattern: 'solid', fgColor: { argb: 'FFE7E9EC' } } as const
const rule: Partial<Border> = { style: 'thin', color: { argb: 'FF8A9099' } }

/** Adds one table as a sheet: header frozen and repeated on every page, widths drawn, print set-up done. */
export function addTable<Line>(workbook: Workbook, document: CutListDocument, table: Table<Line>): Worksheet {
  const sheet = workbook.addWorksheet(table.name, { views: [{ state: 'frozen', ySplit: 1, xSplit: 0 }] })
  sheet.columns = table.columns.map((column) => sheetColumn(column))
  const rows = table.lines.map((line) => table.columns.map((column) => column.value(line)))
  sheet.addRows(rows.map((row) => row.map(cellValue)))
  drawWidths(sheet, table.columns, rows)
  styleHeader(sheet, table.columns.length)
  if (table.group) ruleGroups(sheet, table.lines.map(table.group), table.columns.length)
  for (const [i, text] of (table.closing ?? []).entries()) {
    sheet.getCell(rows.length + 3 + i, 1).value = safeText(text)
    sheet.getCell(rows.length + 3 + i, 1).alignment = { wrapText: false }
  }
  setUpPrint(sheet, document, table.name)
  return sheet
}

/** An empty text is an empty cell. */
const cellValue = (value: CellValue): CellValue => {
  if (typeof value !== 'string') return value
  return value === '' ? undefined : safeText(value)
}

function sheetColumn<Line>({ header, format, wrap }: SheetColumn<Line>): Partial<Column> {
  const alignment: Partial<Alignment> = { vertical: 'top', wrapText: wrap ?? false }
  return {
    header,
    style: {
      font: FONT,
      alignment: format ? { ...alignment, horizontal: 'right' } : alignment,
      numFmt: format,
    },
  }
}

/** Room for a number written as `123 15/16`. */
const NUMBER_WIDTH = 10

function drawWidths<Line>(sheet: Worksheet, columns: SheetColumn<Line>[], rows: CellValue[][]): void {
  columns.forEach((column, i) => {
    // Only the longest word of a header must fit: headers wrap.
    let width = Math.max(...column.header.split(' ').map((word) => word.length))
    for (const row of rows) {
      const value = row[i]
      const needed = typeof value === 'number' ? NUMBER_WIDTH : (value?.length ?? 0)
      if (needed > width) width = needed
    }
    sheet.getColumn(i + 1).width = Math.min(width, column.widest) + 2
  })
}

function styleHeader(sheet: Worksheet, columns: number): void {
  const header = sheet.getRow(1)
  header.height = 46
  for (let i = 1; i <= columns; i += 1) {
    const cell = header.getCell(i)
    cell.font = { ...FONT, bold: true }
    cell.fill = HEADER_FILL
    cell.border = { bottom: rule }
    cell.alignment = { wrapText: true, vertical: 'middle', horizontal: cell.alignment?.horizontal ?? 'left' }
    cell.numFmt = '@'
  }
  sheet.autoFilter = { from: { row: 1, column: 1 }, to: { row: 1, column: columns } }
}

function ruleGroups(sheet: Worksheet, groups: string[], columns: number): void {
  groups.forEach((group, i) => {
    if (i === 0 || group === groups[i - 1]) return
    for (let column = 1; column <= columns; column += 1)
      sheet.getRow(i + 2).getCell(column).border = { top: rule }
  })
}

/** In a header or footer `&` begins a code; doubled it is itself. The whole may have 255 characters. */
const headerText = (text: string, longest: number): string =>
  writableText(text.replace(/[\r\n\t]+/g, ' '))
    .slice(0, longest)
    .replaceAll('&', '&&')

function setUpPrint(sheet: Worksheet, document: CutListDocument, name: string): void {
  const { jobNumber, jobTitle, surveyTitle, revision, made, company } = document
  Object.assign(sheet.pageSetup, {
    orientation: 'landscape',
    paperSize: document.units === 'in' ? LETTER : A4,
    fitToPage: true,
    fitToWidth: 1,
    fitToHeight: 0,
    printTitlesRow: '1:1',
    margins: { left: 0.4, right: 0.4, top: 0.8, bottom: 0.9, header: 0.3, footer: 0.3 },
  })
  const job = `Job ${jobNumber}  ${headerText(jobTitle, 50)}`
  const survey = `${headerText(surveyTitle, 30)}, revision ${revision}`
  sheet.headerFooter.oddHeader = `&L${job}&C${name}&R${survey}  ${made}`
  sheet.headerFooter.oddFooter = `&L&8${SHORT_CAUTION}\n${headerText(company, 30)}&R&8\nPage &P of &N`
}

const LETTER = 1
const A4 = 9
