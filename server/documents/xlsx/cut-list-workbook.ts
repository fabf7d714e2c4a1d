import ExcelJS from 'exceljs'
import type { CutListDocument } from '../cut-list-document'
import { safeText } from '../safe-text'
import { addCutListSheet } from './cut-list-sheet'
import { addFindingsSheet } from './findings-sheet'
import { addPickSheet } from './pick-sheet'

/** The cut list as a workbook of three sheets: *Cut list*, *Fittings to pick*, *Findings*. */
export async function cutListWorkbook(document: CutListDocument): Promise<Buffer> {
  const workbook = new ExcelJS.Workbook()
  workbook.creator = 'Tautbook'
  workbook.title = safeText(`Cut list, job ${document.jobNumber} ${document.jobTitle}`)
  workbook.created = new Date(document.made.replace(' UTC', 'Z').replace(' ', 'T'))
  workbook.modified = workbook.created
  addCutListSheet(workbook, document)
  addPickSheet(workbook, document)
  addFindingsSheet(workbook, document)
  return Buffer.from(await workbook.xlsx.writeBuffer())
}
