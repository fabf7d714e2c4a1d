import { useEffect } from 'react'
import { commandFor } from '../model/commands'
import type { Editor } from '../model/editor'

/**
 * Keys reach the editor from anywhere on its screen but from where somebody types or a sheet lies over it. Enter,
 * arrows and the like belong to whatever button has the focus, and to the photo only when that has it.
 */
export function useKeys(editor: Editor): void {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      const { target } = event
      if (
        !(target instanceof HTMLElement) ||
        target.closest('input, textarea, select, [role=dialog], [role=menu]')
      )
        return
      const onPhoto = target === document.body || target.closest('[role=application]') !== null
      const isSign = event.key.length === 1
      if (!onPhoto && !isSign) return
      const command = commandFor(event)
      if (!command?.when(editor)) return
      event.preventDefault()
      command.perform(editor)
    }
    window.addEventListener('keydown', press)
    return () => window.removeEventListener('keydown', press)
  }, [editor])
}
