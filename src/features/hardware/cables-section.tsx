import type { CatalogueCable } from '@shared/schemas/catalogue'
import type { Cable } from '@shared/schemas/hardware'
import { Length } from '@/components/length'
import type { Column } from '@/components/table'
import { CatalogueSection } from './catalogue-section'
import type { SectionProps } from './fittings-section'
import { findCables } from './find-entries'
import { forceText } from './words'

type Line = Cable & { key: string; retired: boolean }

export function CablesSection(props: SectionProps<CatalogueCable> & { force: 'lbf' | 'N' }) {
  const { entries, search, format, force, ...rest } = props
  const diameter = (line: Line) => <Length value={line.diameter} format={format} />
  const load = ({ breakingLoad }: Line) => (breakingLoad === undefined ? '–' : forceText(breakingLoad, force))
  const columns: Column<Line>[] = [
    { key: 'construction', header: 'Construction', cell: ({ construction }) => construction },
    { key: 'diameter', header: 'Diameter', figures: true, cell: diameter },
    {
      key: 'stiffness',
      header: 'Axial stiffness',
      figures: true,
      cell: ({ axialStiffness }) => forceText(axialStiffness, force),
    },
    { key: 'load', header: 'Breaking load', figures: true, cell: load },
  ]
  return (
    <CatalogueSection<Line>
      label="Cables"
      first="Add the cables you keep on the reel; runs are made of them."
      total={entries.length}
      lines={findCables(entries, search).map(({ key, retired, cable }) => ({ ...cable, key, retired }))}
      columns={columns}
      summary={(line) => (
        <p className="text-soft">
          {line.construction}, {diameter(line)}, axial stiffness {forceText(line.axialStiffness, force)},
          breaking load {load(line)}
        </p>
      )}
      {...rest}
    />
  )
}
