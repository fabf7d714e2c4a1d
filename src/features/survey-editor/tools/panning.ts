import type { ToolPointer } from '../model/inputs'
import type { ToolHost, ToolState } from './tool'

/** The photo follows the hand until it lets go. */
export function panning<Step>(host: ToolHost, from: ToolPointer, after: Step): ToolState<Step> {
  let last = from
  return {
    hint: 'Let go when the photo lies right.',
    pointerMove: (pointer) => {
      host.panBy(pointer.screen.screenX - last.screen.screenX, pointer.screen.screenY - last.screen.screenY)
      last = pointer
    },
    pointerUp: () => after,
  }
}
