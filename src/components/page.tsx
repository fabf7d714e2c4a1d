import { type ReactNode, useEffect } from 'react'
import { classes } from './classes'
import { TautLine } from './taut-line'

interface PageProps {
  title: string
  /** Where this page belongs, above the title. */
  above?: ReactNode
  actions?: ReactNode
  /** Narrow pages are forms and texts, wide ones tables. */
  width?: 'narrow' | 'wide'
  children: ReactNode
}

/** A page's frame: its title in the browser and on the page, what can be done here, and the taut line below. */
export function Page({ title, above, actions, width = 'wide', children }: PageProps) {
  useEffect(() => {
    document.title = `${title} · Tautbook`
  }, [title])
  return (
    <div
      className={classes('mx-auto w-full px-4 py-4 md:py-8', width === 'narrow' ? 'max-w-2xl' : 'max-w-6xl')}
    >
      <header className="mb-6">
        {above ? <div className="mb-1 text-sm text-soft">{above}</div> : null}
        <div className="flex flex-wrap items-end justify-between gap-3">
          <h1 className="min-w-0 text-xl font-semibold md:text-2xl">{title}</h1>
          {actions ? <div className="flex flex-wrap gap-2">{actions}</div> : null}
        </div>
        <TautLine className="mt-3" />
      </header>
      {children}
    </div>
  )
}

export function Card({
  title,
  actions,
  children,
  className,
}: {
  title?: ReactNode
  actions?: ReactNode
  children: ReactNode
  className?: string
}) {
  return (
    <section className={classes('min-w-0 rounded border border-rule bg-card p-4', className)}>
      {title ? (
        <div className="mb-3 flex flex-wrap items-center justify-between gap-2">
          <h2 className="text-lg font-semibold">{title}</h2>
          {actions}
        </div>
      ) : null}
      {children}
    </section>
  )
}
