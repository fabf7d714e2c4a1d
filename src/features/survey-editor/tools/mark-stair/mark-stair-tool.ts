import { makeMachine, type ToolHost, type ToolMachine, type ToolState } from '../tool'

type MarkStairStep = { to: 'idle' } | { to: 'pointing'; bay: string }

const idle = (host: ToolHost): ToolState<MarkStairStep> => ({
  hint: 'Tap a bay that runs down a stair; tap again to make it level.',
  pointerDown: (pointer) => {
    const target = host.targetAt(pointer)
    return target?.kind === 'bay' ? { to: 'pointing', bay: target.id } : undefined
  },
})

const pointing = (host: ToolHost, { bay }: { bay: string }): ToolState<MarkStairStep> => ({
  hint: 'Let go to change the bay.',
  pointerUp: (pointer) => {
    const target = host.targetAt(pointer)
    if (target?.kind === 'bay' && target.id === bay) changeKind(host, bay)
    return { to: 'idle' }
  },
})

/** Level to stair or back. A run cannot bend where the pitch changes, so runs are laid anew in the same change. */
function changeKind(host: ToolHost, id: string): void {
  const { survey } = host.state
  const bay = survey.bays.find((known) => known.id === id)
  if (!bay) return
  const kind = bay.kind === 'stair' ? 'level' : 'stair'
  host.performAndLay({ type: 'bay.set', id, set: { kind }, unset: [] })
  host.select({ kind: 'bay', id })
}

/** Mark stair: a tap turns a bay from level to stair and back. */
export const markStairTool = (host: ToolHost): ToolMachine =>
  makeMachine<MarkStairStep>({ to: 'idle' }, (step) =>
    step.to === 'idle' ? idle(host) : pointing(host, step),
  )
