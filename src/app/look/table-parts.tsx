import { inches } from '@shared/units/length'
import { Length } from '@/components/length'
import { Card } from '@/components/page'
import { type Column, Table } from '@/components/table'
import { Tabs } from '@/components/tabs'

interface Row {
  cable: number
  path: number
  cut: number
  from: string
  mode: string
}

const rows: Row[] = [
  { cable: 1, path: 94.0625, cut: 95.75, from: 'Short anchor for softwood', mode: 'shop' },
  { cable: 10, path: 94.09375, cut: 95.8125, from: 'Long anchor for hardwood', mode: 'site' },
  { cable: 2, path: 94.125, cut: 95.75, from: 'Surface anchor for masonry', mode: 'shop' },
]
const inch = { style: 'inches', finest: 32 } as const
const columns: Column<Row>[] = [
  { key: 'cable', header: 'Cable', cell: ({ cable }) => cable, figures: true, sortBy: ({ cable }) => cable },
  {
    key: 'path',
    header: 'Path',
    cell: ({ path }) => <Length value={inches(path)} format={inch} />,
    figures: true,
    sortBy: ({ path }) => path,
  },
  {
    key: 'cut',
    header: 'Cut',
    cell: ({ cut }) => <Length value={inches(cut)} format={inch} look="computed" className="text-lg" />,
    figures: true,
    sortBy: ({ cut }) => cut,
  },
  { key: 'from', header: 'Fitting', cell: ({ from }) => from, sortBy: ({ from }) => from },
  { key: 'mode', header: 'Mode', cell: ({ mode }) => mode },
]

export function TableParts() {
  const table = (
    <Table caption="Cables of run R1" columns={columns} rows={rows} keyOf={(row) => `${row.cable}`} />
  )
  return (
    <Card title="Tables and tabs">
      <Tabs
        label="Runs"
        tabs={[
          { key: 'R1', label: 'Run R1', content: table },
          { key: 'R2', label: 'Run R2', content: <p>No cable yet.</p> },
          { key: 'pick', label: 'Fittings to pick', content: <p>None yet.</p> },
        ]}
      />
    </Card>
  )
}
