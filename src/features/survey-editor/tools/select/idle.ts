import type { ToolHost, ToolState } from '../tool'
import type { SelectStep } from './steps'

export const idle = (host: ToolHost): ToolState<SelectStep> => ({
  hint: 'Tap a post or a bay; drag a mark to move it.',
  pointerDown: (pointer) => ({ to: 'pointing', start: pointer, target: host.targetAt(pointer) }),
})
