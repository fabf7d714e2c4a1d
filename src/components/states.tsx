import { type ReactNode, useEffect, useState } from 'react'
import { Button } from './button'
import { TautLine } from './taut-line'

/** Shown only when something takes longer than half a second, so that quick pages do not flicker. */
export function Loading({ what }: { what: string }) {
  const [late, setLate] = useState(false)
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), 500)
    return () => clearTimeout(timer)
  }, [])
  return (
    <div role="status" aria-live="polite" className="mx-auto max-w-sm px-4 py-12 text-center text-soft">
      {late ? (
        <>
          <TautLine busy className="mb-3" />
          Fetching {what} …
        </>
      ) : (
        <span className="sr-only">Fetching {what}</span>
      )}
    </div>
  )
}

/** Nothing here yet, and what to do first. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string
  children?: ReactNode
  action?: ReactNode
}) {
  return (
    <div className="rounded border border-dashed border-rule px-4 py-12 text-center">
      <p className="text-lg font-semibold">{title}</p>
      {children ? <div className="mx-auto mt-1 max-w-md text-soft">{children}</div> : null}
      {action ? <div className="mt-4 flex justify-center gap-2">{action}</div> : null}
    </div>
  )
}

interface ErrorNoteProps {
  /** What happened, what was kept and what to do, from `messageOf`. */
  message: string
  onRetry?: () => void
}

export function ErrorNote({ message, onRetry }: ErrorNoteProps) {
  return (
    <div
      role="alert"
      className="flex flex-wrap items-center gap-3 rounded border border-stop bg-stop-ground p-4 text-stop"
    >
      <p className="min-w-0 flex-1 font-medium">{message}</p>
      {onRetry ? <Button onClick={onRetry}>Try again</Button> : null}
    </div>
  )
}
