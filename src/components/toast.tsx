import { toast } from 'sonner'

/** Says that something was done, with a way to take it back. */
export const sayDone = (message: string, undo?: () => void): void => {
  toast(message, undo ? { action: { label: 'Undo', onClick: undo }, duration: 8000 } : {})
}

interface Question {
  /** What is done all the same. */
  label: string
  onGo: () => void
  /** The question was put away. */
  onStay: () => void
}

/** Asks before something that cannot be taken back. Answers how to withdraw the question once it no longer stands. */
export function askBefore(message: string, { label, onGo, onStay }: Question): () => void {
  let open = true
  const answer = (act: () => void) => () => {
    if (open) act()
    open = false
  }
  const id = toast.warning(message, {
    action: { label, onClick: answer(onGo) },
    onDismiss: answer(onStay),
    duration: Infinity,
    closeButton: true,
  })
  return () => {
    open = false
    toast.dismiss(id)
  }
}

/** Says what could not be done; stays until it is put away. */
export const sayProblem = (message: string): void => {
  toast.error(message, { duration: Infinity, closeButton: true })
}
