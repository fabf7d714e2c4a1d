import type { ToolPointer } from '../../model/inputs'

export type JoinBayStep =
  | { to: 'idle' }
  | { to: 'pointing'; start: ToolPointer; post: string; from: string | null }
  | { to: 'dragging'; from: string }
  /** One post chosen; the next one tapped is joined to it. */
  | { to: 'chosen'; from: string }
