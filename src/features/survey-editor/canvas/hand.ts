import { screenPoint } from '../model/camera'
import type { Editor } from '../model/editor'
import type { PointerInput } from '../model/inputs'

/** Carries pointers and the wheel from the canvas's element to the editor. Answers how to stop. */
export function listenToHand(element: HTMLElement, editor: Editor): () => void {
  let spaceHeld = false
  const at = (event: MouseEvent) => {
    const { left, top } = element.getBoundingClientRect()
    return screenPoint(event.clientX - left, event.clientY - top)
  }
  const pointer = (event: PointerEvent): PointerInput => ({
    id: event.pointerId,
    kind: event.pointerType === 'touch' ? 'touch' : event.pointerType === 'pen' ? 'pen' : 'mouse',
    at: at(event),
    panning: event.button === 1 || spaceHeld,
  })
  const down = (event: PointerEvent) => {
    if (event.pointerType === 'mouse' && event.button > 1) return
    element.setPointerCapture(event.pointerId)
    element.focus({ preventScroll: true })
    event.preventDefault()
    editor.pointerDown(pointer(event))
  }
  const move = (event: PointerEvent) => editor.pointerMove(pointer(event))
  const up = (event: PointerEvent) => editor.pointerUp(pointer(event))
  const lost = (event: PointerEvent) => editor.pointerLost(event.pointerId)
  const wheel = (event: WheelEvent) => {
    event.preventDefault()
    const lines = event.deltaMode === WheelEvent.DOM_DELTA_LINE ? 16 : 1
    editor.wheel({
      at: at(event),
      deltaX: event.deltaX * lines,
      deltaY: event.deltaY * lines,
      pinching: event.ctrlKey,
    })
  }
  const space = (event: KeyboardEvent) => {
    if (event.key === ' ') spaceHeld = event.type === 'keydown'
  }
  element.addEventListener('pointerdown', down)
  element.addEventListener('pointermove', move)
  element.addEventListener('pointerup', up)
  element.addEventListener('pointercancel', lost)
  element.addEventListener('wheel', wheel, { passive: false })
  window.addEventListener('keydown', space)
  window.addEventListener('keyup', space)
  return () => {
    element.removeEventListener('pointerdown', down)
    element.removeEventListener('pointermove', move)
    element.removeEventListener('pointerup', up)
    element.removeEventListener('pointercancel', lost)
    element.removeEventListener('wheel', wheel)
    window.removeEventListener('keydown', space)
    window.removeEventListener('keyup', space)
  }
}
