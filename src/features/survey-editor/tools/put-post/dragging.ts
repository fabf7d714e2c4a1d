import type { ToolPointer } from '../../model/inputs'
import type { ToolHost, ToolState } from '../tool'
import { putPost } from './put-post'
import type { PutPostStep } from './steps'

/** Drawing a post from its foot to its top. */
export const dragging = (host: ToolHost, { start }: { start: ToolPointer }): ToolState<PutPostStep> => {
  const end = (): PutPostStep => {
    host.draw(null)
    host.showLoupe(null)
    return { to: 'idle' }
  }
  return {
    hint: 'Let go at the top of the post.',
    pointerMove: (pointer) => {
      host.showLoupe(pointer.photo)
      host.draw({
        kind: 'stroke',
        post: host.state.placing,
        stroke: { base: start.photo, top: pointer.photo },
      })
    },
    pointerUp: (pointer) => {
      const next = end()
      putPost(host, { base: start.photo, top: pointer.photo })
      return next
    },
    cancel: end,
  }
}
