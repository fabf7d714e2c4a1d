import { toast } from 'sonner'

/** Says that something was done, with a way to take it back. */
export const sayDone = (message: string, undo?: () => void): void => {
  toast(message, undo ? { action: { label: 'Undo', onClick: undo }, duration: 8000 } : {})
}

/** Says what could not be done; stays until it is put away. */
export const sayProblem = (message: string): void => {
  toast.error(message, { duration: Infinity, closeButton: true })
}
