import type { ReactNode } from 'react'
import type { CutListGroup, CutListTotals } from '@shared/cut-list/cut-list-rows'
import type { Finding } from '@shared/schemas/finding'
import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { RunTable } from './run-table'
import { modeWords } from './words'

/** Draws a finding. */
export type ShowFinding = (finding: Finding) => ReactNode

interface RunSectionProps {
  group: CutListGroup
  format: LengthFormat
  workingOf: (run: string, cable: number) => string
  show: ShowFinding
}

/** One run: what it is, its findings, its cables. */
export function RunSection({ group, format, workingOf, show }: RunSectionProps) {
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
      <Findings findings={findings} show={show} />
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

/** What was noticed: what is to be looked at, and below it, folded away, what is good to know. */
export function Findings({ findings, show }: { findings: readonly Finding[]; show: ShowFinding }) {
  const notes = findings.filter(({ level }) => level === 'note')
  const grave = findings.filter(({ level }) => level !== 'note')
  return (
    <>
      {grave.length > 0 ? <FindingList findings={grave} show={show} /> : null}
      {notes.length > 0 ? (
        <details>
          <summary className="min-h-12 py-3 text-soft">
            {notes.length === 1 ? '1 note' : `${notes.length} notes`}
          </summary>
          <FindingList findings={notes} show={show} />
        </details>
      ) : null}
    </>
  )
}

const FindingList = ({ findings, show }: { findings: readonly Finding[]; show: ShowFinding }) => (
  <ul aria-label="Findings" className="flex flex-col gap-2">
    {findings.map((finding) => (
      <li key={`${finding.code} ${finding.text}`}>{show(finding)}</li>
    ))}
  </ul>
)

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
