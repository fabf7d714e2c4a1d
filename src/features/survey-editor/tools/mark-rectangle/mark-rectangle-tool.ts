import type { PhotoPoint } from '@shared/geometry/point'
import { makeMachine, type ToolHost, type ToolMachine, type ToolState } from '../tool'
import type { RectangleStep } from './steps'

/** Clockwise as seen in the photo; width is the near side, depth runs away from the viewer. */
const places = ['near left', 'far left', 'far right', 'near right'] as const

const hintFor = (count: number): string =>
  count < 4
    ? `Tap the ${places[count] ?? ''} corner of a flat rectangle you can measure (${count + 1} of 4).`
    : 'Give its width and depth, or tap to begin again.'

const waiting = (host: ToolHost, corners: PhotoPoint[]): ToolState<RectangleStep> => ({
  hint: hintFor(corners.length),
  pointerDown: (pointer) => {
    host.showLoupe(pointer.photo)
    return { to: 'pointing', corners: corners.length === 4 ? [] : corners }
  },
  cancel: () => {
    host.draw(null)
    return { to: 'idle' }
  },
})

const pointing = (host: ToolHost, { corners }: { corners: PhotoPoint[] }): ToolState<RectangleStep> => ({
  hint: 'Let go on the corner.',
  pointerMove: (pointer) => {
    host.showLoupe(pointer.photo)
    host.draw({ kind: 'rectangle', corners: [...corners, pointer.photo] })
  },
  pointerUp: (pointer) => {
    const marked = [...corners, pointer.photo]
    host.showLoupe(null)
    host.draw({ kind: 'rectangle', corners: marked })
    if (marked.length === 4) host.select({ kind: 'rectangle', id: host.state.photoId ?? '' })
    return { to: 'marked', corners: marked }
  },
  cancel: () => {
    host.showLoupe(null)
    host.draw(corners.length > 0 ? { kind: 'rectangle', corners } : null)
    return corners.length > 0 ? { to: 'marked', corners } : { to: 'idle' }
  },
})

/** Mark rectangle: four corners; the change is made when its width and depth are given. */
export const markRectangleTool = (host: ToolHost): ToolMachine =>
  makeMachine<RectangleStep>({ to: 'idle' }, (step) =>
    step.to === 'pointing' ? pointing(host, step) : waiting(host, step.to === 'marked' ? step.corners : []),
  )
