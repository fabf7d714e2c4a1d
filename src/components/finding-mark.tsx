import type { ReactNode } from 'react'
import type { Finding, FindingLevel } from '@shared/schemas/finding'
import { classes } from './classes'

const colours: Record<FindingLevel, string> = { note: 'text-steel', check: 'text-marker', stop: 'text-stop' }
const grounds: Record<FindingLevel, string> = {
  note: 'border-rule bg-card',
  check: 'border-marker bg-marker-ground',
  stop: 'border-stop bg-stop-ground',
}

/** A finding's shape: circle for a note, triangle for a check, octagon for a stop; never colour alone. */
export function FindingMark({ level, className }: { level: FindingLevel; className?: string }) {
  return (
    <svg
      role="img"
      aria-label={level}
      viewBox="0 0 20 20"
      className={classes('size-5 shrink-0', colours[level], className)}
      fill="none"
      stroke="currentColor"
      strokeWidth="2"
    >
      {level === 'note' && <circle cx="10" cy="10" r="7.5" />}
      {level === 'check' && <path d="M10 2.5 18.5 17.5H1.5Z" strokeLinejoin="round" />}
      {level === 'stop' && <path d="M6.5 2h7L18 6.5v7L13.5 18h-7L2 13.5v-7Z" strokeLinejoin="round" />}
      <path d={level === 'check' ? 'M10 8v4.5M10 14.5v1' : 'M10 6v5.5M10 13.5v1'} />
    </svg>
  )
}

/** A mixed number stays on one line: torn apart, 4 27/32 would be read as 4. */
const unbroken = (text: string): string => text.replace(/(\d) (\d+\/\d)/g, '$1\u00a0$2')

/** A finding as a line of a list, with a way to where it is: beside it, on a phone below it. */
export function FindingItem({
  finding,
  action,
  muted = false,
  children,
}: {
  finding: Pick<Finding, 'level' | 'text' | 'rule'>
  action?: ReactNode
  /** It was let pass. */
  muted?: boolean
  children?: ReactNode
}) {
  return (
    <div
      className={classes(
        'grid grid-cols-[auto_minmax(0,1fr)] items-start gap-x-3 rounded border p-3 sm:grid-cols-[auto_minmax(0,1fr)_auto]',
        muted ? 'border-rule bg-card' : grounds[finding.level],
      )}
    >
      <FindingMark level={finding.level} className="mt-0.5" />
      <div>
        <p className="text-base">{unbroken(finding.text)}</p>
        {finding.rule ? <p className="mt-1 text-sm text-soft">{finding.rule}</p> : null}
        {children}
      </div>
      {action ? <div className="col-start-2 -ml-4 sm:col-start-3 sm:ml-0">{action}</div> : null}
    </div>
  )
}
