import { Link } from 'react-router-dom'
import type { CutListGroup, CutListRow } from '@shared/cut-list/cut-list-rows'
import type { LengthFormat } from '@shared/units/format-length'
import { toInches, toMillimetres } from '@shared/units/length'
import { Length } from '@/components/length'
import { type Column, Table } from '@/components/table'
import { TakeUpBar } from './take-up-bar'
import { whyWords } from './words'

interface RunTableProps {
  group: CutListGroup
  format: LengthFormat
  workingOf: (run: string, cable: number) => string
}

/** The cables of one run, the highest first, as they hang. */
export function RunTable({ group, format, workingOf }: RunTableProps) {
  const computed = (value: number | undefined, className = '') =>
    value === undefined ? null : (
      <Length value={value} format={format} look="computed" className={className} />
    )
  const columns: Column<CutListRow>[] = [
    {
      key: 'cable',
      header: 'Cable',
      cell: ({ name, cable }) => (
        <Link
          to={workingOf(cable.run, cable.cable)}
          className="inline-flex min-h-10 items-center whitespace-nowrap font-medium text-spruce underline"
          aria-label={`Working of cable ${name}`}
        >
          {name}
        </Link>
      ),
    },
    {
      key: 'cut',
      header: 'Cut',
      cell: ({ cable }) => (
        <>
          {computed(cable.cut, 'text-lg font-semibold')}
          {cable.mode === 'none' ? (
            <span className="font-medium text-stop">{whyWords[cable.why]}</span>
          ) : null}
          {cable.finish === undefined ? null : (
            <span className="block text-sm">finish at {computed(cable.finish)}</span>
          )}
        </>
      ),
    },
    { key: 'mode', header: 'Mode', cell: ({ cable }) => cable.mode },
    { key: 'height', header: 'Height', figures: true, cell: ({ cable }) => computed(cable.height) },
    { key: 'path', header: 'Path', figures: true, wideOnly: true, cell: ({ cable }) => computed(cable.path) },
    {
      key: 'fittings',
      header: 'Fittings',
      wideOnly: true,
      cell: ({ fromPost, toPost, fromFitting, toFitting }) => (
        <span className="text-sm">
          {fromPost}: {fromFitting ?? '—'}
          <br />
          {toPost}: {toFitting ?? '—'}
        </span>
      ),
    },
    {
      key: 'take-up',
      header: 'Take-up, planned and worst',
      cell: ({ cable }) => (cable.mode === 'none' ? null : <TakeUp cable={cable} format={format} />),
    },
  ]
  return (
    <Table
      caption={`Cables of run ${group.run.run}`}
      columns={columns}
      rows={group.rows.toReversed()}
      keyOf={({ name }) => name}
    />
  )
}

/** Take-up is read as a decimal: it is compared, not measured. */
const takeUpText = (nm: number, { style }: LengthFormat): string =>
  style === 'millimetres' ? toMillimetres(nm).toFixed(1) : toInches(nm).toFixed(2)

function TakeUp({
  cable: { planned, worst, limit },
  format,
}: {
  cable: Exclude<CutListRow['cable'], { mode: 'none' }>
  format: LengthFormat
}) {
  const [used, most, has] = [planned, worst, limit].map((nm) => takeUpText(nm, format))
  const unit = format.style === 'millimetres' ? 'mm' : 'in'
  const words = `${used} planned, ${most} at worst, of ${has} ${unit}`
  return (
    <div className="min-w-32">
      <TakeUpBar planned={planned} worst={worst} limit={limit} words={words} />
      <span aria-hidden="true" className="text-sm text-soft">
        {used} · {most} of {has} {unit}
      </span>
    </div>
  )
}
