import type { CablePick, FittingPick } from '@shared/cut-list/fittings-to-pick'
import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { Card } from '@/components/page'

interface PickListProps {
  fittings: readonly FittingPick[]
  cables: readonly CablePick[]
  format: LengthFormat
}

/** What to take from the shelf and the reels for this cut list. */
export function PickList({ fittings, cables, format }: PickListProps) {
  return (
    <Card title="To pick">
      <ul className="figures grid gap-x-8 gap-y-1 text-lg md:grid-cols-2">
        {fittings.map(({ id, name, count }) => (
          <li key={id} className="flex justify-between gap-4">
            <span>{name}</span>
            <span className="font-semibold">{count}</span>
          </li>
        ))}
        {cables.map(({ id, name, count, length }) => (
          <li key={id} className="flex justify-between gap-4">
            <span>
              {name}, {count} {count === 1 ? 'piece' : 'pieces'}
            </span>
            <Length value={length} format={format} look="computed" className="font-semibold" />
          </li>
        ))}
      </ul>
    </Card>
  )
}
