/** The first thing the keyboard reaches: past what every page repeats, to what this one says. */
export function SkipLink({ to = 'content' }: { to?: string }) {
  return (
    <a
      href={`#${to}`}
      className="sr-only focus:not-sr-only focus:fixed focus:left-2 focus:top-2 focus:z-50 focus:rounded focus:bg-card focus:p-3 print:hidden"
    >
      Skip to the content
    </a>
  )
}
