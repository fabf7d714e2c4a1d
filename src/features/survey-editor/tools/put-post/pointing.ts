import { screenDistance } from '../../model/camera'
import type { Target } from '../../model/hit-test'
import { strayOf, type ToolPointer } from '../../model/inputs'
import { guessTop, photoOf } from '../../model/marks'
import type { ToolHost, ToolState } from '../tool'
import { putPost } from './put-post'
import type { PutPostStep } from './steps'

/** Pressed, not moved yet: letting go puts a post that stands up by a guess, or selects the post that is there. */
export const pointing = (
  host: ToolHost,
  { start, target }: { start: ToolPointer; target: Target | undefined },
): ToolState<PutPostStep> => ({
  hint: 'Let go to put the post here, or draw up to its top.',
  pointerMove: (pointer) =>
    screenDistance(start.screen, pointer.screen) > strayOf(pointer.kind)
      ? { to: 'dragging', start }
      : undefined,
  pointerUp: () => {
    if (target?.kind === 'post' && !host.state.placing) {
      host.select({ kind: 'post', id: target.id })
    } else {
      const photo = photoOf(host.state.survey, host.state.photoId)
      putPost(host, { base: start.photo, top: guessTop(start.photo, Object.values(photo?.posts ?? {})) })
    }
    return { to: 'idle' }
  },
})
