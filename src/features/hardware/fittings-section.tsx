import type { ReactNode } from 'react'
import type { CatalogueFitting } from '@shared/schemas/catalogue'
import type { Fitting } from '@shared/schemas/hardware'
import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'
import type { Column } from '@/components/table'
import { CatalogueSection } from './catalogue-section'
import { mountWords } from './words'
import { findFittings } from './find-entries'

export interface SectionProps<Entry> {
  entries: readonly Entry[]
  search: string
  format: LengthFormat
  pathOf: (key: string) => string
  add: ReactNode
  onRetire: ((entry: { key: string; name: string; retired: boolean }) => void) | null
}

type Line = Fitting & { key: string; retired: boolean }

export function FittingsSection({ entries, search, format, ...rest }: SectionProps<CatalogueFitting>) {
  const length = (value: number) => <Length value={value} format={format} />
  const columns: Column<Line>[] = [
    { key: 'mount', header: 'Mount', cell: ({ mount }) => mountWords[mount].short },
    { key: 'body', header: 'Body', figures: true, cell: ({ body }) => length(body) },
    { key: 'head', header: 'Head', figures: true, cell: ({ headProjection }) => length(headProjection) },
    { key: 'takeUp', header: 'Take-up', figures: true, cell: ({ takeUp }) => length(takeUp) },
    { key: 'angle', header: 'Angle to', figures: true, cell: ({ maxAngle }) => `${maxAngle}°` },
    { key: 'materials', header: 'Posts', cell: ({ materials }) => materials.join(', ') },
  ]
  return (
    <CatalogueSection<Line>
      label="Fittings"
      first="Add the fittings you buy; cut lists choose from them."
      total={entries.length}
      lines={findFittings(entries, search).map(({ key, retired, fitting }) => ({ ...fitting, key, retired }))}
      columns={columns}
      summary={({ mount, body, takeUp, maxAngle, materials }) => (
        <p className="text-soft">
          {mountWords[mount].short}, body {length(body)}, take-up {length(takeUp)}, to {maxAngle}°,{' '}
          {materials.join(', ')}
        </p>
      )}
      {...rest}
    />
  )
}
