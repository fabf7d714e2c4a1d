import type { Workbook } from 'exceljs'
import type { CutListDocument } from '../cut-list-document'
import { type JudgedFinding, overrulingText } from '../judged-finding'
import { addTable } from './sheet'

/** Everything the tool noticed, what stops the work first. */
export function addFindingsSheet(workbook: Workbook, document: CutListDocument): void {
  const lines = document.findings
  addTable<JudgedFinding>(workbook, document, {
    name: 'Findings',
    columns: [
      { header: 'Level', value: ({ finding }) => finding.level, widest: 8 },
      { header: 'Run', value: ({ finding }) => finding.where.run, widest: 14 },
      { header: 'Bay', value: ({ finding }) => finding.where.bay, widest: 14 },
      { header: 'Post', value: ({ finding }) => finding.where.post, widest: 14 },
      { header: 'Finding', value: ({ finding }) => finding.text, widest: 80, wrap: true },
      { header: 'Rule', value: ({ finding }) => finding.rule, widest: 40, wrap: true },
      {
        header: 'Overruled',
        value: ({ overruling }) => (overruling ? overrulingText(overruling) : undefined),
        widest: 40,
        wrap: true,
      },
      { header: 'Code', value: ({ finding }) => finding.code, widest: 26 },
    ],
    lines,
    closing: [
      ...(lines.length === 0 ? ['Nothing was noticed.'] : []),
      'Sections of guard rules are for orientation: confirm with the authority having jurisdiction.',
    ],
  })
}
