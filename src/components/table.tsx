import { type ReactNode, useState } from 'react'
import { classes } from './classes'
import { nextSort, type Sort, sortRows, type SortValue } from './sort-rows'

export interface Column<Row> {
  key: string
  header: ReactNode
  cell: (row: Row) => ReactNode
  /** Figures stand at the right, in a column. */
  figures?: boolean
  /** Left out on a narrow screen, where the first columns say enough. */
  wideOnly?: boolean
  /** What the rows can be sorted by in this column; without it the column cannot be sorted. */
  sortBy?: (row: Row) => SortValue
}

interface TableProps<Row> {
  /** What the table holds, for screen readers. */
  caption: string
  columns: readonly Column<Row>[]
  rows: readonly Row[]
  keyOf: (row: Row) => string
  className?: string
}

const columnClasses = ({ figures = false, wideOnly = false }: { figures?: boolean; wideOnly?: boolean }) =>
  classes(figures && 'text-right', wideOnly && 'hidden md:table-cell print:table-cell')

/** A dense table. Wider than the screen it scrolls inside itself, never the page. */
export function Table<Row>({ caption, columns, rows, keyOf, className }: TableProps<Row>) {
  const [sort, setSort] = useState<Sort>()
  const sortBy = columns.find(({ key }) => key === sort?.key)?.sortBy
  const shown = sort && sortBy ? sortRows(rows, sortBy, sort.down) : rows
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
              <Header key={column.key} column={column} sort={sort} onSort={setSort} />
            ))}
          </tr>
        </thead>
        <tbody>
          {shown.map((row) => (
            <tr key={keyOf(row)} className="border-b border-rule last:border-0">
              {columns.map((column) => (
                <td key={column.key} className={classes('px-2 py-2 md:px-3', columnClasses(column))}>
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

interface HeaderProps<Row> {
  column: Column<Row>
  sort: Sort | undefined
  onSort: (sort: Sort | undefined) => void
}

function Header<Row>({ column, sort, onSort }: HeaderProps<Row>) {
  const look = classes('text-sm font-medium text-soft', columnClasses(column))
  if (!column.sortBy) {
    return (
      <th scope="col" className={classes('px-2 py-2 md:px-3', look)}>
        {column.header}
      </th>
    )
  }
  const sorted = sort?.key === column.key ? (sort.down ? 'descending' : 'ascending') : undefined
  return (
    <th scope="col" aria-sort={sorted} className={look}>
      <button
        type="button"
        className={classes(
          'inline-flex min-h-12 w-full items-center gap-1 px-2 -outline-offset-2 hover:text-ink md:px-3',
          column.figures === true && 'justify-end',
          sorted && 'text-spruce',
        )}
        onClick={() => onSort(nextSort(sort, column.key))}
      >
        {column.header}
        <SortMark sorted={sorted} />
      </button>
    </th>
  )
}

/** An arrow up or down, or a short line where nothing is sorted; the place is kept, so that columns stand still. */
function SortMark({ sorted }: { sorted: 'ascending' | 'descending' | undefined }) {
  const arrow = sorted === 'ascending' ? 'M5 9V1M2 4l3-3 3 3' : sorted ? 'M5 1v8M2 6l3 3 3-3' : 'M3 5h4'
  return (
    <svg aria-hidden="true" viewBox="0 0 10 10" className="size-2.5 shrink-0 print:hidden">
      <path d={arrow} fill="none" stroke="currentColor" strokeWidth="1.5" />
    </svg>
  )
}
