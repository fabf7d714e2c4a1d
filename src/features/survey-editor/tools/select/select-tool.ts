import { panning } from '../panning'
import { makeMachine, type ToolHost, type ToolMachine } from '../tool'
import { dragging } from './dragging'
import { idle } from './idle'
import { pointing } from './pointing'
import type { SelectStep } from './steps'

/** Select and move: tap to select, drag a mark to move it, drag bare photo to move the photo. */
export const selectTool = (host: ToolHost): ToolMachine =>
  makeMachine<SelectStep>({ to: 'idle' }, (step) => {
    switch (step.to) {
      case 'idle':
        return idle(host)
      case 'pointing':
        return pointing(host, step)
      case 'dragging':
        return dragging(host, step)
      case 'panning':
        return panning<SelectStep>(host, step.last, { to: 'idle' })
    }
  })
