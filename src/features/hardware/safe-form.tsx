import { type ReactNode, useEffect, useRef } from 'react'
import { Button } from '@/components/button'
import { ErrorNote } from '@/components/states'
import { whyNotSaved } from './refusal'

interface SafeFormProps {
  onSave: () => void
  busy: boolean
  error: unknown
  saveLabel: string
  children: ReactNode
  /** Other things to do, beside the button that saves. */
  actions?: ReactNode
}

/** A form that never saves past what it could not read, and goes to the first field that needs another look. */
export function SafeForm({ onSave, busy, error, saveLabel, children, actions }: SafeFormProps) {
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => {
    if (error) form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus()
  }, [error])
  return (
    <form
      ref={form}
      className="flex flex-col gap-5"
      onSubmit={(event) => {
        event.preventDefault()
        const unread = event.currentTarget.querySelector<HTMLElement>('[data-unread]')
        if (unread) unread.focus()
        else onSave()
      }}
    >
      {error ? <ErrorNote message={whyNotSaved(error)} /> : null}
      {children}
      <div className="flex flex-wrap gap-2">
        <Button type="submit" look="primary" busy={busy} className="max-md:w-full">
          {saveLabel}
        </Button>
        {actions}
      </div>
    </form>
  )
}
