import type { ToolPointer } from '../../model/inputs'
import { panning } from '../panning'
import { makeMachine, type ToolHost, type ToolMachine, type ToolState } from '../tool'

type PanStep = { to: 'idle' } | { to: 'dragging'; from: ToolPointer }

const idle = (): ToolState<PanStep> => ({
  hint: 'Drag the photo; pinch or turn the wheel to zoom.',
  pointerDown: (pointer) => ({ to: 'dragging', from: pointer }),
})

/** Moves the photo and nothing else. */
export const panTool = (host: ToolHost): ToolMachine =>
  makeMachine<PanStep>({ to: 'idle' }, (step) =>
    step.to === 'idle' ? idle() : panning<PanStep>(host, step.from, { to: 'idle' }),
  )
