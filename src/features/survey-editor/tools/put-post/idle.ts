import type { ToolHost, ToolState } from '../tool'
import type { PutPostStep } from './steps'

export const idle = (host: ToolHost): ToolState<PutPostStep> => ({
  hint: host.state.placing
    ? `Tap the foot of ${host.state.placing} on this photo.`
    : 'Tap the foot of a post, or draw it from foot to top.',
  pointerDown: (pointer) => ({ to: 'pointing', start: pointer, target: host.targetAt(pointer) }),
})
