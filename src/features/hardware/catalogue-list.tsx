import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Button } from '@/components/button'
import { type Column, Table } from '@/components/table'

export interface CatalogueLine {
  key: string
  name: string
  id: string
  retired: boolean
}

export interface CatalogueListProps<Line extends CatalogueLine> {
  label: string
  lines: readonly Line[]
  /** What a table on a desk shows of each, after its name. */
  columns: readonly Column<Line>[]
  /** What a card on a phone shows of each, below its name. */
  summary: (line: Line) => ReactNode
  pathOf: (key: string) => string
  /** None for somebody who may only look. */
  onRetire: ((line: Line) => void) | null
}

/** Fittings or cables: a dense table on a desk, cards on a phone. */
export function CatalogueList<Line extends CatalogueLine>(props: CatalogueListProps<Line>) {
  const { label, lines, columns, summary, pathOf, onRetire } = props
  const name = ({ key, name: text }: Line) => (
    <Link to={pathOf(key)} className="inline-block py-1 font-medium text-spruce underline">
      {text}
    </Link>
  )
  const retire = (line: Line) =>
    onRetire ? (
      <Button
        look="quiet"
        aria-label={`${line.retired ? 'Offer again' : 'Retire'}: ${line.name}`}
        onClick={() => onRetire(line)}
      >
        {line.retired ? 'Offer again' : 'Retire'}
      </Button>
    ) : null
  const all: Column<Line>[] = [
    { key: 'name', header: 'Name', cell: name },
    { key: 'id', header: 'Id', cell: ({ id }) => id },
    ...columns,
    ...(onRetire
      ? [{ key: 'retire', header: <span className="sr-only">Offered</span>, figures: true, cell: retire }]
      : []),
  ]
  return (
    <>
      <Table
        className="hidden md:block"
        caption={label}
        columns={all}
        rows={lines}
        keyOf={({ key }) => key}
      />
      <ul aria-label={label} className="flex flex-col gap-2 md:hidden">
        {lines.map((line) => (
          <li key={line.key} className="rounded border border-rule bg-card p-4">
            <div className="flex items-baseline justify-between gap-3">
              <span className="min-w-0 text-lg leading-6">{name(line)}</span>
              <span className="figures shrink-0 text-sm text-soft">{line.id}</span>
            </div>
            {summary(line)}
            {onRetire ? <div className="-mb-2 -ml-4 mt-1">{retire(line)}</div> : null}
          </li>
        ))}
      </ul>
    </>
  )
}
