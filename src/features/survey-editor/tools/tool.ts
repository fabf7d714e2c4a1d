import type { PhotoPoint } from '@shared/geometry/point'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import type { Selection } from '../model/editor-context'
import type { Draft, EditorState } from '../model/editor-state'
import type { Target } from '../model/hit-test'
import type { ToolPointer } from '../model/inputs'

/** What a tool may see and do. */
export interface ToolHost {
  readonly state: EditorState
  /** The nearest mark under a pointer. */
  targetAt: (pointer: ToolPointer) => Target | undefined
  /** One finished gesture. */
  perform: (operation: SurveyOperation) => void
  select: (selection: Selection) => void
  draw: (draft: Draft | null) => void
  showLoupe: (at: PhotoPoint | null) => void
  panBy: (dx: number, dy: number) => void
  setPlacing: (post: string | null) => void
  /** The same, with the runs it asks for. */
  performAndLay: (operation: SurveyOperation) => void
}

/** One state of a tool: what it does with the hand, and the step it goes to next, if any. */
export interface ToolState<Step> {
  /** What the tool waits for here. */
  hint: string
  pointerDown?: (pointer: ToolPointer) => Step | void
  pointerMove?: (pointer: ToolPointer) => Step | void
  pointerUp?: (pointer: ToolPointer) => Step | void
  /** Leaves nothing behind. */
  cancel?: () => Step | void
}

/** A tool: its states by name, and the one it rests in. */
export interface ToolMachine {
  readonly stateName: string
  readonly hint: string
  pointerDown: (pointer: ToolPointer) => void
  pointerMove: (pointer: ToolPointer) => void
  pointerUp: (pointer: ToolPointer) => void
  /** Escape, a second finger, another tool: back to rest with nothing changed. Says whether there was anything to drop. */
  cancel: () => boolean
}

/** Runs a tool from the steps its states ask for; each step names the state to go to and what it needs to know. */
export function makeMachine<Step extends { to: string }>(
  rest: Step,
  enter: (step: Step) => ToolState<Step>,
): ToolMachine {
  let step = rest
  let state = enter(rest)
  const go = (next: Step | void) => {
    if (!next) return
    step = next
    state = enter(next)
  }
  return {
    get stateName() {
      return step.to
    },
    get hint() {
      return state.hint
    },
    pointerDown: (pointer) => go(state.pointerDown?.(pointer)),
    pointerMove: (pointer) => {
      const next = state.pointerMove?.(pointer)
      go(next)
      // The move that turns a press into a drag is the drag's first.
      if (next) state.pointerMove?.(pointer)
    },
    pointerUp: (pointer) => go(state.pointerUp?.(pointer)),
    cancel: () => {
      const busy = step.to !== rest.to
      const after = state.cancel?.()
      go(after ?? rest)
      return busy
    },
  }
}
