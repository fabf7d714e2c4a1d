import { type ReactNode, useEffect, useRef } from 'react'
import { whyNotSaved } from '@/lib/refusal'
import { Button } from './button'
import { ErrorNote } from './states'

interface SafeFormProps {
  onSave: () => void
  busy: boolean
  error: unknown
  saveLabel: string
  children: ReactNode
}

/** Under the thumb on a phone, above the way between pages; at the foot of the window on a desk. */
const bar =
  'sticky bottom-[calc(3.5rem+env(safe-area-inset-bottom))] z-10 -mx-4 flex flex-wrap gap-2 border-t border-rule ' +
  'bg-paper px-4 py-3 md:bottom-0 md:mx-0 md:px-0'

/** A form that never saves past what it could not read, and goes to the first field that needs another look. */
export function SafeForm({ onSave, busy, error, saveLabel, children }: SafeFormProps) {
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => {
    if (error) form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus()
  }, [error])
  return (
    <form
      ref={form}
      // A field that the keyboard reaches must not hide behind the bar below.
      className="flex flex-col gap-5 [&_:is(input,button)]:scroll-mb-40"
      onSubmit={(event) => {
        event.preventDefault()
        const unread = event.currentTarget.querySelector<HTMLElement>('[data-unread]')
        if (unread) unread.focus()
        else onSave()
      }}
    >
      {error ? <ErrorNote message={whyNotSaved(error)} /> : null}
      {children}
      <div className={bar}>
        <Button type="submit" look="primary" busy={busy} className="max-md:grow">
          {saveLabel}
        </Button>
      </div>
    </form>
  )
}
