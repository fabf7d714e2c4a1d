import type { Workbook } from 'exceljs'
import { type CutListDocument } from '../cut-list-document'
import { inUnits } from '../cut-list-lines'
import { lengthFormat } from '../length-format'
import { addTable } from './sheet'

interface PickLine {
  kind: 'fitting' | 'cable'
  id: string
  name: string
  count: number
  /** Of all pieces of a cable together. */
  length?: number
}

/** Fittings and cable that the cut list takes. */
export function addPickSheet(workbook: Workbook, document: CutListDocument): void {
  const { picks, units } = document
  const lines: PickLine[] = [
    ...picks.fittings.map((pick) => ({ kind: 'fitting' as const, ...pick })),
    ...picks.cables.map(({ length, ...pick }) => ({
      kind: 'cable' as const,
      ...pick,
      length: inUnits(length, units),
    })),
  ]
  const lengths = lines.map(({ length }) => length).filter((length) => length !== undefined)
  addTable(workbook, document, {
    name: 'Fittings to pick',
    columns: [
      { header: 'Kind', value: ({ kind }) => kind, widest: 10 },
      { header: 'Id', value: ({ id }) => id, widest: 24 },
      { header: 'Name', value: ({ name }) => name, widest: 60, wrap: true },
      { header: 'Pieces', value: ({ count }) => count, widest: 8, format: '0' },
      {
        header: `Cable in all (${units})`,
        value: ({ length }) => length,
        widest: 14,
        format: lengthFormat(lengths, document),
      },
    ],
    lines,
    group: ({ kind }) => kind,
  })
}
