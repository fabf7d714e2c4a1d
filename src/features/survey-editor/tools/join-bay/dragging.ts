import type { ToolPointer } from '../../model/inputs'
import type { ToolHost, ToolState } from '../tool'
import { joinBay } from './join-bay'
import type { JoinBayStep } from './steps'

/** Drawing a bay from a post; it snaps onto the post under the hand. */
export const dragging = (host: ToolHost, { from }: { from: string }): ToolState<JoinBayStep> => {
  const onto = (pointer: ToolPointer): string | null => {
    const target = host.targetAt(pointer)
    return target?.kind === 'post' && target.id !== from ? target.id : null
  }
  const end = (): JoinBayStep => {
    host.draw(null)
    host.showLoupe(null)
    return { to: 'idle' }
  }
  return {
    hint: 'Let go on the neighbouring post.',
    pointerMove: (pointer) => {
      host.showLoupe(pointer.photo)
      host.draw({ kind: 'bay', from, to: pointer.photo, onto: onto(pointer) })
    },
    pointerUp: (pointer) => {
      const post = onto(pointer)
      const next = end()
      if (post) joinBay(host, from, post)
      return next
    },
    cancel: end,
  }
}
