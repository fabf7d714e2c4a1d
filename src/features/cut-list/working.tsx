import type { ReactNode } from 'react'
import { type Phrase, writePhrase } from '@shared/calculation/phrase'
import type { CableWorking, EndWorking, WorkingLine } from '@shared/calculation/working'
import type { Units } from '@shared/schemas/quantities'
import { toInches, toMillimetres } from '@shared/units/length'
import { Card } from '@/components/page'

interface WorkingProps {
  working: CableWorking
  units: Units
}

/** Figures of a working are shown to four decimals of an inch or two of a millimetre: enough to add them up again. */
const figure = (nm: number, units: Units): string =>
  units.length === 'in' ? `${toInches(nm).toFixed(4)} in` : `${toMillimetres(nm).toFixed(2)} mm`

/** The whole working of one cable, in the order a person would work it out. */
export function Working({ working, units }: WorkingProps) {
  const { path, pathTotal, ends, base, limits, slop, siteSlop, stretch, limit, longest, outcome } = working
  const lines = (given: (WorkingLine | undefined)[]) => given.filter((line) => line !== undefined)
  return (
    <div className="flex flex-col gap-4">
      <p className="text-lg font-medium">{writePhrase(working.mode, units)}</p>
      <Part title="Length to cut" lines={outcome} units={units} />
      <Part title="Height" lines={[working.height]} units={units} />
      <Part title="Path, bay by bay and post by post" lines={lines([...path, pathTotal])} units={units} />
      {ends.map((end) => (
        <End key={end.end} end={end} units={units} />
      ))}
      <Part title="Length that would sit exactly untensioned" lines={lines([base])} units={units} />
      <Part
        title="Slop: every limit that may fall the wrong way"
        lines={lines([...limits, slop, siteSlop])}
        units={units}
      />
      <Part title="Take-up" lines={lines([stretch, limit, longest])} units={units} />
    </div>
  )
}

function Part({
  title,
  lines,
  units,
  children,
}: {
  title: string
  lines: readonly WorkingLine[]
  units: Units
  children?: ReactNode
}) {
  if (lines.length === 0 && !children) return null
  const text = (phrase: Phrase) => writePhrase(phrase, units)
  return (
    <Card title={title}>
      <dl className="divide-y divide-rule">
        {lines.map(({ label, value, reason }, i) => (
          // Lines of a working have no name of their own and never move.
          <div key={i} className="grid grid-cols-[1fr_auto] gap-x-4 py-2">
            <dt className="font-medium">{text(label)}</dt>
            <dd className="figures text-right text-lg text-spruce">{figure(value, units)}</dd>
            <dd className="col-span-2 text-sm text-soft">{text(reason)}</dd>
          </div>
        ))}
      </dl>
      {children}
    </Card>
  )
}

function End({ end, units }: { end: EndWorking; units: Units }) {
  const { post, name, reason, depth, passedOver } = end
  return (
    <Part title={`Fitting at ${post}: ${name ?? 'none'}`} lines={depth ? [depth] : []} units={units}>
      <p className="mt-1">{writePhrase(reason, units)}</p>
      {passedOver.length > 0 ? (
        <details className="mt-2">
          <summary className="min-h-10 py-2 font-medium">
            Passed over: {passedOver.map((passed) => passed.name).join(', ')}
          </summary>
          <ul className="mt-1 flex flex-col gap-1 text-sm">
            {passedOver.map((passed) => (
              <li key={passed.fitting}>
                <strong>{passed.name}</strong>: {writePhrase(passed.reason, units)}
              </li>
            ))}
          </ul>
        </details>
      ) : null}
    </Part>
  )
}
