import type { PhotoPoint } from '@shared/geometry/point'
import type { Target } from '../../model/hit-test'
import type { ToolPointer } from '../../model/inputs'
import { photoOf, strokesOf, type Stroke } from '../../model/marks'
import type { ToolHost, ToolState } from '../tool'
import type { SelectStep } from './steps'

/** A mark follows the hand as a draft; letting go makes it one change, cancelling leaves it where it was. */
export const dragging = (
  host: ToolHost,
  { start, target }: { start: ToolPointer; target: Target },
): ToolState<SelectStep> => {
  const moved = mover(host, start, target)
  const end = (): SelectStep => {
    host.draw(null)
    host.showLoupe(null)
    return { to: 'idle' }
  }
  return {
    hint: 'Let go where the mark belongs.',
    pointerMove: (pointer) => {
      host.showLoupe(pointer.photo)
      moved.draw(pointer)
    },
    pointerUp: (pointer) => {
      moved.finish(pointer)
      return end()
    },
    cancel: end,
  }
}

interface Mover {
  draw: (pointer: ToolPointer) => void
  finish: (pointer: ToolPointer) => void
}

const by = ([x, y]: PhotoPoint, start: ToolPointer, now: ToolPointer): PhotoPoint => [
  x + now.photo[0] - start.photo[0],
  y + now.photo[1] - start.photo[1],
]

function mover(host: ToolHost, start: ToolPointer, target: Target): Mover {
  const { survey, photoId } = host.state
  const photo = photoOf(survey, photoId)
  if (target.kind === 'post') {
    const stroke = strokesOf(survey, photo).get(target.id)
    if (photo && stroke)
      return strokeMover(host, { photo: photo.id, post: target.id, part: target.part, stroke, start })
  }
  if (target.kind === 'corner' && photo?.rectangle) {
    const { rectangle } = photo
    const corners = (now: ToolPointer) => {
      const [a, b, c, d] = rectangle.corners
      const at = (corner: PhotoPoint, i: number) => (i === target.index ? by(corner, start, now) : corner)
      return [at(a, 0), at(b, 1), at(c, 2), at(d, 3)] as [PhotoPoint, PhotoPoint, PhotoPoint, PhotoPoint]
    }
    return {
      draw: (now) => host.draw({ kind: 'corners', corners: corners(now) }),
      finish: (now) =>
        host.perform({
          type: 'photo.setRectangle',
          photo: photo.id,
          rectangle: { ...rectangle, corners: corners(now) },
        }),
    }
  }
  return { draw: () => undefined, finish: () => undefined }
}

function strokeMover(
  host: ToolHost,
  grip: { photo: string; post: string; part: 'base' | 'top' | 'stroke'; stroke: Stroke; start: ToolPointer },
): Mover {
  const { photo, post, part, stroke, start } = grip
  const at = (now: ToolPointer): Stroke => ({
    base: part === 'top' ? stroke.base : by(stroke.base, start, now),
    top: part === 'base' ? stroke.top : by(stroke.top, start, now),
  })
  return {
    draw: (now) => host.draw({ kind: 'stroke', post, stroke: at(now) }),
    finish: (now) => {
      host.perform({ type: 'photo.mark', photo, post, mark: at(now) })
      host.select({ kind: 'post', id: post })
    },
  }
}
