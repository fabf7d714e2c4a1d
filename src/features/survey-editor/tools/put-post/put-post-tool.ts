import { makeMachine, type ToolHost, type ToolMachine } from '../tool'
import { dragging } from './dragging'
import { idle } from './idle'
import { pointing } from './pointing'
import type { PutPostStep } from './steps'

/** Put post: tap a foot, or draw from foot to top. */
export const putPostTool = (host: ToolHost): ToolMachine =>
  makeMachine<PutPostStep>({ to: 'idle' }, (step) => {
    switch (step.to) {
      case 'idle':
        return idle(host)
      case 'pointing':
        return pointing(host, step)
      case 'dragging':
        return dragging(host, step)
    }
  })
