import { screenDistance } from '../../model/camera'
import { strayOf, type ToolPointer } from '../../model/inputs'
import type { ToolHost, ToolState } from '../tool'
import { joinBay } from './join-bay'
import type { JoinBayStep } from './steps'

/** A post is pressed: letting go chooses it, or joins it to the one chosen before; drawing on starts a bay from it. */
export const pointing = (
  host: ToolHost,
  { start, post, from }: { start: ToolPointer; post: string; from: string | null },
): ToolState<JoinBayStep> => ({
  hint: 'Let go, or draw to the next post.',
  pointerMove: (pointer) =>
    screenDistance(start.screen, pointer.screen) > strayOf(pointer.kind)
      ? { to: 'dragging', from: post }
      : undefined,
  pointerUp: () => {
    if (from === null || from === post) host.select({ kind: 'post', id: post })
    else joinBay(host, from, post)
    // The next bay goes on from here, as a guard does.
    return { to: 'chosen', from: post }
  },
})
