import { classes } from '@/components/classes'

interface SaveStateProps {
  /** Changes the server has not confirmed yet. */
  unsent: number
  /** The last try did not reach the server. */
  waiting: boolean
}

/** How far the survey is saved, in words. */
export function SaveState({ unsent, waiting }: SaveStateProps) {
  const text = unsent === 0 ? 'Saved' : waiting ? `On this screen, waiting to be sent (${unsent})` : 'Sending'
  return (
    <span
      role="status"
      className={classes(
        'block truncate text-xs',
        waiting && unsent > 0 ? 'font-medium text-marker' : 'text-soft',
      )}
    >
      {text}
    </span>
  )
}
