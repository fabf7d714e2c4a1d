import { useNavigate } from 'react-router-dom'
import { sayProblem } from '@/components/toast'
import type { ChangeQueue } from '@/features/surveys/change-queue'

/** Goes to another page of a survey once its changes have reached the server, so that the page shows them. */
export function useGoWhenSaved(queue: ChangeQueue): (to: string) => void {
  const navigate = useNavigate()
  return (to) => {
    void queue.settled().then(() => {
      if (queue.getSnapshot().pending.length > 0) {
        sayProblem(
          'Some changes have not reached the server yet. They are kept on this screen; try again with signal.',
        )
        return undefined
      }
      return navigate(to)
    })
  }
}
