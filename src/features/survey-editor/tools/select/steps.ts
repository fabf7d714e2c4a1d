import type { Target } from '../../model/hit-test'
import type { ToolPointer } from '../../model/inputs'

export type SelectStep =
  | { to: 'idle' }
  | { to: 'pointing'; start: ToolPointer; target: Target | undefined }
  | { to: 'dragging'; start: ToolPointer; target: Target }
  | { to: 'panning'; last: ToolPointer }
