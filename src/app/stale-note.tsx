import { Button } from '@/components/button'
import { messageOf } from '@/lib/api-error'
import { momentText } from '@/lib/date-text'

interface StaleNoteProps {
  /** When what is shown was read, in milliseconds. */
  readAt: number
  error: Error
  onRetry: () => void
}

/** What is shown could not be read again: it may have changed since. */
export const StaleNote = ({ readAt, error, onRetry }: StaleNoteProps) => (
  <div
    role="status"
    className="mb-4 flex flex-wrap items-center gap-3 rounded border border-marker bg-marker-ground p-4 text-marker"
  >
    <p className="min-w-0 flex-1 font-medium">
      As it was at {momentText(readAt)}; it could not be read again. {messageOf(error)}
    </p>
    <Button onClick={onRetry}>Try again</Button>
  </div>
)
