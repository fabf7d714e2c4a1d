import type { PhotoPoint } from '@shared/geometry/point'
import type { Survey } from '@shared/schemas/survey'
import type { ToolName } from '../tools/tool-names'
import type { Camera, Viewport } from './camera'
import type { Selection } from './editor-context'
import type { Stroke } from './marks'

/** What the hand is drawing; gone when the gesture ends or is cancelled. */
export type Draft =
  | { kind: 'stroke'; post: string | null; stroke: Stroke }
  | { kind: 'bay'; from: string; to: PhotoPoint; onto: string | null }
  | { kind: 'rectangle'; corners: PhotoPoint[] }
  | { kind: 'corners'; corners: readonly [PhotoPoint, PhotoPoint, PhotoPoint, PhotoPoint] }

export interface EditorState {
  survey: Survey
  photoId: string | null
  viewport: Viewport
  cameras: Readonly<Record<string, Camera>>
  tool: ToolName
  selection: Selection
  draft: Draft | null
  /** The place under the finger that the loupe shows. */
  loupe: PhotoPoint | null
  /** Where the keyboard points, once arrows have been used on the photo. */
  cursor: PhotoPoint | null
  /** A post of the survey that the next tap of *put post* marks on this photo. */
  placing: string | null
  /** What the current tool waits for, in a few words, for the screen and for screen readers. */
  hint: string
  canEdit: boolean
  canUndo: boolean
  canRedo: boolean
}

/** Where each part of the state may be kept: with the survey on the server, in this tab's memory, or nowhere. */
export const keeping: Record<keyof EditorState, 'server' | 'tab' | 'nowhere'> = {
  survey: 'server',
  photoId: 'tab',
  viewport: 'nowhere',
  cameras: 'tab',
  tool: 'tab',
  selection: 'tab',
  draft: 'nowhere',
  loupe: 'nowhere',
  cursor: 'nowhere',
  placing: 'nowhere',
  hint: 'nowhere',
  canEdit: 'nowhere',
  canUndo: 'tab',
  canRedo: 'tab',
}
