interface TakeUpBarProps {
  /** Nanometres: what is planned to be used, the worst it can come to, and what the fittings have. */
  planned: number
  worst: number
  limit: number
  /** The figures in words, for everybody who does not see the bar. */
  words: string
}

/** How much of the fittings' take-up a cable uses: solid as planned, light up to the worst, against the limit's tick. */
export function TakeUpBar({ planned, worst, limit, words }: TakeUpBarProps) {
  const full = Math.max(limit, worst, 1)
  const percent = (nm: number) => `${(Math.max(0, nm) / full) * 100}%`
  const over = worst > limit
  return (
    <svg role="img" aria-label={words} className="block h-4 w-full min-w-24" preserveAspectRatio="none">
      <line x1="0" y1="8" x2="100%" y2="8" className="stroke-rule" strokeWidth="2" />
      <rect
        x="0"
        y="4"
        width={percent(worst)}
        height="8"
        className={over ? 'fill-stop' : 'fill-spruce'}
        opacity="0.3"
      />
      <rect x="0" y="4" width={percent(planned)} height="8" className={over ? 'fill-stop' : 'fill-spruce'} />
      <line
        x1={percent(limit)}
        x2={percent(limit)}
        y1="0"
        y2="16"
        className="stroke-ink"
        strokeWidth="2"
        transform="translate(-1 0)"
      />
      <line x1="1" x2="1" y1="0" y2="16" className="stroke-ink" strokeWidth="2" />
    </svg>
  )
}
