import { screenDistance } from '../../model/camera'
import { type ToolPointer, strayOf } from '../../model/inputs'
import type { Target } from '../../model/hit-test'
import type { ToolHost, ToolState } from '../tool'
import type { SelectStep } from './steps'

/** Pressed, not moved yet: letting go selects, moving on drags the mark or, on bare photo, the photo. */
export const pointing = (
  host: ToolHost,
  { start, target }: { start: ToolPointer; target: Target | undefined },
): ToolState<SelectStep> => ({
  hint: 'Let go to select, or drag.',
  pointerMove: (pointer) => {
    if (screenDistance(start.screen, pointer.screen) <= strayOf(pointer.kind)) return
    if (!target || target.kind === 'bay' || !host.state.canEdit) return { to: 'panning', last: start }
    return { to: 'dragging', start, target }
  },
  pointerUp: () => {
    host.select(selectionOf(target, host.state.photoId))
    return { to: 'idle' }
  },
})

function selectionOf(target: Target | undefined, photoId: string | null) {
  if (!target) return { kind: 'none' } as const
  if (target.kind === 'corner') return { kind: 'rectangle', id: photoId ?? '' } as const
  return { kind: target.kind, id: target.id } as const
}
