import type { Workbook } from 'exceljs'
import { type Finding, type FindingLevel } from '@shared/schemas/finding'
import type { CutListDocument } from '../cut-list-document'
import { addTable } from './sheet'

const order: Record<FindingLevel, number> = { stop: 0, check: 1, note: 2 }

/** Everything the tool noticed, what stops the work first. */
export function addFindingsSheet(workbook: Workbook, document: CutListDocument): void {
  const { groups, findings } = document.cutList
  const lines = [...findings, ...groups.flatMap((group) => group.findings)].sort(
    (a, b) => order[a.level] - order[b.level],
  )
  addTable<Finding>(workbook, document, {
    name: 'Findings',
    columns: [
      { header: 'Level', value: ({ level }) => level, widest: 8 },
      { header: 'Run', value: ({ where }) => where.run, widest: 14 },
      { header: 'Cable', value: ({ where }) => where.cable, widest: 6, format: '0' },
      { header: 'Bay', value: ({ where }) => where.bay, widest: 14 },
      { header: 'Post', value: ({ where }) => where.post, widest: 14 },
      { header: 'Finding', value: ({ text }) => text, widest: 90, wrap: true },
      { header: 'Code', value: ({ code }) => code, widest: 26 },
    ],
    lines,
    closing: lines.length === 0 ? ['Nothing was noticed.'] : [],
  })
}
