import { useEffect, useRef } from 'react'

/** For a form whose answer may be a refusal: takes the person to the first field that was refused. */
export function useFirstFault(error: unknown) {
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => {
    if (error) form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus()
  }, [error])
  return form
}
