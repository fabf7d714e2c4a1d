import type { ToolHost, ToolState } from '../tool'
import type { JoinBayStep } from './steps'

export const chosen = (host: ToolHost, { from }: { from: string }): ToolState<JoinBayStep> => ({
  hint: `Tap the post next to ${from}; tap bare photo to stop.`,
  pointerDown: (pointer) => {
    const target = host.targetAt(pointer)
    if (target?.kind === 'post') return { to: 'pointing', start: pointer, post: target.id, from }
    host.select({ kind: 'none' })
    return { to: 'idle' }
  },
})
