import { makeMachine, type ToolHost, type ToolMachine } from '../tool'
import { chosen } from './chosen'
import { dragging } from './dragging'
import { idle } from './idle'
import { pointing } from './pointing'
import type { JoinBayStep } from './steps'

/** Join bay: post to post, by taps or by drawing. */
export const joinBayTool = (host: ToolHost): ToolMachine =>
  makeMachine<JoinBayStep>({ to: 'idle' }, (step) => {
    switch (step.to) {
      case 'idle':
        return idle(host)
      case 'chosen':
        return chosen(host, step)
      case 'pointing':
        return pointing(host, step)
      case 'dragging':
        return dragging(host, step)
    }
  })
