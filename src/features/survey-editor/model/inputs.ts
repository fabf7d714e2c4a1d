import type { PhotoPoint } from '@shared/geometry/point'
import type { ScreenPoint } from './camera'

/** A finger, a pen or a mouse, as it reaches the canvas. */
export interface PointerInput {
  id: number
  kind: 'touch' | 'pen' | 'mouse'
  at: ScreenPoint
  /** The middle button, or the main one with the space bar held: pan, whatever the tool. */
  panning?: boolean
}

/** The same, as a tool sees it. */
export interface ToolPointer {
  kind: PointerInput['kind']
  screen: ScreenPoint
  photo: PhotoPoint
}

export interface WheelInput {
  at: ScreenPoint
  /** Pixels; up is negative. */
  deltaX: number
  deltaY: number
  /** A pinch on a trackpad, or Ctrl held; a plain wheel zooms too, since there is nothing to scroll. */
  pinching: boolean
}

/** How far a finger may stray, in screen pixels, before a press is a drag. */
export const strayOf = (kind: PointerInput['kind']): number => (kind === 'touch' ? 10 : 4)

/** How near to a mark counts as on it, in screen pixels: a target of 48 px under a finger. */
export const reachOf = (kind: PointerInput['kind']): number => (kind === 'touch' ? 24 : 12)
