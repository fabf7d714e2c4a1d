import type { ReactNode } from 'react'
import { FindingMark } from '@/components/finding-mark'
import type { Verdict } from './verdict'

export interface FigureLine {
  label: string
  value: ReactNode
  /** What is asked of it, or what it means. */
  note?: ReactNode
  /** Whether it holds, where something is asked of it. */
  verdict?: Verdict | undefined
}

/** Computed figures, each with what is asked of it and whether that holds. */
export const FigureList = ({ lines }: { lines: readonly FigureLine[] }) => (
  <dl className="grid content-start gap-x-6 sm:grid-cols-2">
    {lines.map(({ label, value, note, verdict }) => (
      <div key={label} className="min-w-0 border-b border-rule py-2">
        <dt className="text-sm font-medium text-soft">{label}</dt>
        <dd className="figures flex flex-wrap items-center gap-2 text-lg text-spruce">
          {value}
          {verdict === 'holds' ? <span className="text-sm font-medium text-soft">holds</span> : null}
          {verdict && verdict !== 'holds' ? <FindingMark level={verdict} className="print:text-ink" /> : null}
        </dd>
        {note ? <dd className="text-sm text-soft">{note}</dd> : null}
      </div>
    ))}
  </dl>
)
