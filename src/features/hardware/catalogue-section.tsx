import { type ReactNode, useId } from 'react'
import { EmptyState } from '@/components/states'
import { type CatalogueLine, CatalogueList, type CatalogueListProps } from './catalogue-list'

interface CatalogueSectionProps<Line extends CatalogueLine> extends CatalogueListProps<Line> {
  /** How many there are before the search, retired ones too. */
  total: number
  /** What to do where there are none at all. */
  first: string
  /** A link that adds one, for those who may. */
  add: ReactNode
}

/** All fittings or all cables, with what is offered first and what is retired folded away. */
export function CatalogueSection<Line extends CatalogueLine>(props: CatalogueSectionProps<Line>) {
  const { total, first, add, ...list } = props
  const { label, lines } = list
  const id = useId()
  const offered = lines.filter(({ retired }) => !retired)
  const retired = lines.filter((line) => line.retired)
  return (
    <section aria-labelledby={id}>
      <div className="mb-3 flex flex-wrap items-center justify-between gap-2">
        <h2 id={id} className="text-lg font-semibold">
          {label}
        </h2>
        {add}
      </div>
      {total === 0 ? <EmptyState title={`No ${label.toLowerCase()} yet`}>{first}</EmptyState> : null}
      {total > 0 && lines.length === 0 ? (
        <p className="text-soft">None of the {label.toLowerCase()} matches. Search for less.</p>
      ) : null}
      {lines.length > 0 && offered.length === 0 ? (
        <p className="text-soft">Those that match are retired.</p>
      ) : null}
      {offered.length > 0 ? <CatalogueList {...list} lines={offered} /> : null}
      {retired.length > 0 ? (
        <details className="mt-2">
          <summary className="min-h-12 py-3 font-medium text-soft">Retired ({retired.length})</summary>
          <CatalogueList {...list} label={`${label}, retired`} lines={retired} />
        </details>
      ) : null}
    </section>
  )
}
