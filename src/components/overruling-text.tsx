import type { Overruling } from '@shared/survey/overrule'
import { momentText } from '@/lib/date-text'

/** How a stop was let pass: by whom, when and why, and whether that still counts. */
export function OverrulingText({ overruling: { overrule, stands } }: { overruling: Overruling }) {
  const who = `${overrule.by ?? 'somebody unnamed'}${overrule.on ? `, ${momentText(overrule.on)}` : ''}`
  return (
    <p className="mt-2 text-sm">
      <strong className="font-medium">{stands ? 'Overruled' : 'Was overruled'}</strong> by {who}: “
      {overrule.reason}”{stands ? null : ' That was with other numbers, and counts no more.'}
    </p>
  )
}
