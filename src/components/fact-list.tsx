import type { ReactNode } from 'react'

export interface Fact {
  label: string
  value: ReactNode
  /** What it means, in one sentence. */
  meaning?: string
}

/** What somebody may read and not change: plain figures, no greyed-out fields. */
export const FactList = ({ facts }: { facts: readonly Fact[] }) => (
  <dl className="grid gap-x-8 md:grid-cols-2">
    {facts.map(({ label, value, meaning }) => (
      <div key={label} className="border-b border-rule py-3">
        <dt className="text-sm font-medium text-soft">{label}</dt>
        <dd className="figures text-lg">{value}</dd>
        {meaning ? <dd className="text-sm text-soft">{meaning}</dd> : null}
      </div>
    ))}
  </dl>
)
