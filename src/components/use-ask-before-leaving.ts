import { useCallback, useEffect, useRef } from 'react'
import { useBlocker } from 'react-router-dom'
import { askBefore } from './toast'

/**
 * Asks before a page with unsaved edits is left, also by closing the tab. Answers how to go on after saving, when nothing
 * is left to lose.
 */
export function useAskBeforeLeaving(unsaved: boolean): () => void {
  const isSaved = useRef(false)
  useEffect(() => {
    if (!unsaved) return
    const warn = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', warn)
    return () => window.removeEventListener('beforeunload', warn)
  }, [unsaved])
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) =>
      unsaved && !isSaved.current && currentLocation.pathname !== nextLocation.pathname,
  )
  useEffect(() => {
    if (blocker.state !== 'blocked') return
    return askBefore('What you changed here is not saved yet and would be lost.', {
      label: 'Leave all the same',
      onGo: blocker.proceed,
      onStay: blocker.reset,
    })
  }, [blocker])
  return useCallback(() => {
    isSaved.current = true
  }, [])
}
