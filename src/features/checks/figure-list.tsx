import type { ReactNode } from 'react'
import { FindingMark } from '@/components/finding-mark'
import type { FindingLevel } from '@shared/schemas/finding'

export interface FigureLine {
  label: string
  value: ReactNode
  /** What is asked of it, or what it means. */
  note?: ReactNode
  /** Where it does not hold. */
  level?: FindingLevel | undefined
}

/** Computed figures, each with what is asked of it and a shape where that does not hold. */
export const FigureList = ({ lines }: { lines: readonly FigureLine[] }) => (
  <dl className="grid gap-x-6 sm:grid-cols-2">
    {lines.map(({ label, value, note, level }) => (
      <div key={label} className="border-b border-rule py-2">
        <dt className="text-sm font-medium text-soft">{label}</dt>
        <dd className="figures flex items-center gap-2 text-lg text-spruce">
          {value}
          {level ? <FindingMark level={level} /> : null}
        </dd>
        {note ? <dd className="text-sm text-soft">{note}</dd> : null}
      </div>
    ))}
  </dl>
)
