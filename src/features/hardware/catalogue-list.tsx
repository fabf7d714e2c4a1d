import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { Button } from '@/components/button'

export interface CatalogueLine {
  key: string
  name: string
  id: string
  retired: boolean
  /** What matters of it, in a few words. */
  facts: ReactNode
}

interface CatalogueListProps {
  label: string
  lines: readonly CatalogueLine[]
  pathOf: (key: string) => string
  /** None for somebody who may only look. */
  onRetire: ((line: CatalogueLine) => void) | null
}

/** Fittings or cables; retired ones are folded away below. */
export function CatalogueList({ label, lines, pathOf, onRetire }: CatalogueListProps) {
  const offered = lines.filter(({ retired }) => !retired)
  const retired = lines.filter((line) => line.retired)
  const item = (line: CatalogueLine) => (
    <li
      key={line.key}
      className="flex flex-wrap items-center justify-between gap-3 border-b border-rule py-2 last:border-0"
    >
      <div className="min-w-0 flex-1">
        <Link to={pathOf(line.key)} className="inline-block py-1 text-base font-medium text-spruce underline">
          {line.name}
        </Link>{' '}
        <span className="figures text-sm text-soft">{line.id}</span>
        <p className="figures text-sm">{line.facts}</p>
      </div>
      {onRetire ? (
        <Button
          look="quiet"
          aria-label={`${line.retired ? 'Offer' : 'Retire'} ${line.name}`}
          onClick={() => onRetire(line)}
        >
          {line.retired ? 'Offer again' : 'Retire'}
        </Button>
      ) : null}
    </li>
  )
  return (
    <>
      <ul aria-label={label}>{offered.map(item)}</ul>
      {retired.length > 0 ? (
        <details className="mt-2">
          <summary className="min-h-12 py-3 font-medium text-soft">Retired ({retired.length})</summary>
          <ul aria-label={`${label}, retired`}>{retired.map(item)}</ul>
        </details>
      ) : null}
    </>
  )
}
