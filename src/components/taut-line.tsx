import { classes } from './classes'

interface TautLineProps {
  /** 0 is slack (dashed all along), 1 is taut; in between the taut part grows from the left. */
  share?: number
  /** Moves, for work whose length is not known. */
  busy?: boolean
  className?: string
}

/** The one line of the house: a straight 2 px line held by two short end ticks. Decoration; words beside it carry the meaning. */
export function TautLine({ share = 1, busy = false, className }: TautLineProps) {
  const taut = `${Math.min(1, Math.max(0, share)) * 100}%`
  return (
    <svg
      aria-hidden="true"
      className={classes('block h-3 w-full text-spruce', className)}
      preserveAspectRatio="none"
    >
      <g stroke="currentColor" strokeWidth="2">
        <line x1="1" y1="1" x2="1" y2="11" />
        <line x1="100%" y1="1" x2="100%" y2="11" transform="translate(-1 0)" />
        <line
          x1="0"
          y1="6"
          x2="100%"
          y2="6"
          strokeDasharray="6 6"
          opacity={busy ? 1 : 0.45}
          style={busy ? { animation: 'tighten 0.8s linear infinite' } : undefined}
        />
        {!busy && <line x1="0" y1="6" x2={taut} y2="6" />}
      </g>
    </svg>
  )
}

interface ProgressProps {
  /** What is under way: `Sending the photo`. */
  label: string
  /** 0 to 1. */
  share: number
}

/** How far some work has come: the line tightens from slack to taut, and the figure beside says the same. */
export function Progress({ label, share }: ProgressProps) {
  const percent = Math.round(Math.min(1, Math.max(0, share)) * 100)
  return (
    <div role="progressbar" aria-label={label} aria-valuenow={percent} aria-valuemin={0} aria-valuemax={100}>
      <span className="figures flex justify-between gap-3 text-sm text-soft">
        <span>{label}</span>
        <span>{percent} %</span>
      </span>
      <TautLine share={share} />
    </div>
  )
}

/** Tautbook's mark and name. */
export function Brand({ className }: { className?: string }) {
  return (
    <span className={classes('inline-flex items-center gap-2 font-semibold', className)}>
      <svg aria-hidden="true" width="28" height="16" className="text-spruce">
        <path d="M2 8h24M2 2v12M26 2v12" stroke="currentColor" strokeWidth="2" fill="none" />
      </svg>
      Tautbook
    </span>
  )
}
