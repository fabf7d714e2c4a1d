import type { ReactNode } from 'react'
import type { CutListGroup, CutListTotals } from '@shared/cut-list/cut-list-rows'
import type { Finding } from '@shared/schemas/finding'
import type { LengthFormat } from '@shared/units/format-length'
import { FindingItem } from '@/components/finding-mark'
import { Length } from '@/components/length'
import { RunTable } from './run-table'
import { modeWords } from './words'

interface RunSectionProps {
  group: CutListGroup
  format: LengthFormat
  workingOf: (run: string, cable: number) => string
  /** A way to where a finding is. */
  goThere: (finding: Finding) => ReactNode
}

/** One run: what it is, its findings, its cables. */
export function RunSection({ group, format, workingOf, goThere }: RunSectionProps) {
  const { run, findings } = group
  return (
    <section aria-label={`Run ${run.run}`} className="flex flex-col gap-3">
      <div className="flex flex-wrap items-baseline justify-between gap-2">
        <h2 className="text-lg font-semibold">
          Run {run.run}, {run.fromPost} to {run.toPost}
        </h2>
        <p className="text-soft">
          {group.rows[0]?.cableName}, <Totals totals={group.totals} format={format} />
        </p>
      </div>
      <Findings findings={findings} goThere={goThere} />
      {(['shop', 'site', 'none'] as const).map((mode) =>
        group.totals[mode] > 0 ? (
          <p key={mode} className="text-sm text-soft">
            <strong className="font-medium text-ink">{mode}</strong>: {modeWords[mode]}
          </p>
        ) : null,
      )}
      {group.rows.length > 0 ? (
        <RunTable group={group} format={format} workingOf={workingOf} />
      ) : (
        <p className="text-soft">This run has no cable yet: its opening leaves no room for one.</p>
      )}
    </section>
  )
}

/** The gravest first. */
const order: Record<Finding['level'], number> = { stop: 0, check: 1, note: 2 }

export function Findings({
  findings,
  goThere,
}: {
  findings: readonly Finding[]
  goThere: (finding: Finding) => ReactNode
}) {
  if (findings.length === 0) return null
  const sorted = findings.toSorted((a, b) => order[a.level] - order[b.level])
  return (
    <ul aria-label="Findings" className="flex flex-col gap-2">
      {sorted.map((finding) => (
        <li key={`${finding.code} ${finding.text}`}>
          <FindingItem finding={finding} action={goThere(finding)} />
        </li>
      ))}
    </ul>
  )
}

export function Totals({ totals, format }: { totals: CutListTotals; format: LengthFormat }) {
  const parts = [
    totals.shop > 0 ? `${totals.shop} shop` : '',
    totals.site > 0 ? `${totals.site} site` : '',
    totals.none > 0 ? `${totals.none} without length` : '',
  ].filter(Boolean)
  return (
    <>
      {totals.cables === 1 ? '1 cable' : `${totals.cables} cables`} ({parts.join(', ')}),{' '}
      <Length value={totals.length} format={format} look="computed" /> in all
    </>
  )
}
