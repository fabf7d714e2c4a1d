import type { ReactNode } from 'react'
import { classes } from './classes'

export interface Column<Row> {
  key: string
  header: ReactNode
  cell: (row: Row) => ReactNode
  /** Figures stand at the right, in a column. */
  figures?: boolean
  /** Left out on a narrow screen, where the first columns say enough. */
  wideOnly?: boolean
}

interface TableProps<Row> {
  /** What the table holds, for screen readers. */
  caption: string
  columns: readonly Column<Row>[]
  rows: readonly Row[]
  keyOf: (row: Row) => string
  className?: string
}

/** A dense table. Wider than the screen it scrolls inside itself, never the page. */
export function Table<Row>({ caption, columns, rows, keyOf, className }: TableProps<Row>) {
  const cell = (column: Column<Row>) =>
    classes(
      'px-2 py-2 md:px-3',
      column.figures === true && 'text-right',
      column.wideOnly === true && 'hidden md:table-cell',
    )
  return (
    // Focusable, so that the keyboard can scroll it.
    <div
      className={classes('relative overflow-x-auto rounded border border-rule bg-card', className)}
      tabIndex={0}
      role="group"
      aria-label={caption}
    >
      <table className="w-full border-collapse text-left text-base">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b border-rule">
            {columns.map((column) => (
              <th
                key={column.key}
                scope="col"
                className={classes(cell(column), 'text-sm font-medium text-soft')}
              >
                {column.header}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={keyOf(row)} className="border-b border-rule last:border-0">
              {columns.map((column) => (
                <td key={column.key} className={cell(column)}>
                  {column.cell(row)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
