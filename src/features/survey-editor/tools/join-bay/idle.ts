import type { ToolHost, ToolState } from '../tool'
import type { JoinBayStep } from './steps'

export const idle = (host: ToolHost): ToolState<JoinBayStep> => ({
  hint: 'Tap two neighbouring posts, or draw from one to the other.',
  pointerDown: (pointer) => {
    const target = host.targetAt(pointer)
    if (target?.kind === 'post') return { to: 'pointing', start: pointer, post: target.id, from: null }
    host.select(target?.kind === 'bay' ? target : { kind: 'none' })
  },
})
