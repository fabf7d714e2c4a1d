import type { SurveyChange } from '@shared/endpoints/surveys'
import type { Survey } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { OperationRefused } from '@shared/survey/operation-refused'

/** What the server has, and what this hand has done since. */
export interface QueueState {
  revision: number
  confirmed: Survey
  /** `confirmed` with everything pending applied: what the screen shows. */
  shown: Survey
  /** In the order they were made. */
  pending: readonly SurveyChange[]
  /** So many of the first pending are on their way. */
  sending: number
  /** The last try did not reach the server. */
  waiting: boolean
}

export type QueueEvent =
  | { type: 'performed'; change: SurveyChange }
  | { type: 'sending'; count: number }
  /** Not taken, for one of them; each is to be tried by itself. */
  | { type: 'held' }
  | { type: 'accepted'; revision: number }
  | { type: 'unreachable' }
  /** The server's survey read again, and which changes it has seen already. */
  | { type: 'reread'; revision: number; survey: Survey; seen: ReadonlySet<string> }
  /** The server will not have these; what it has was read again. */
  | { type: 'refused'; revision: number; survey: Survey; seen: ReadonlySet<string> }

/** At most so many changes in one request. */
export const BATCH = 100

export const newQueue = (survey: Survey, revision: number): QueueState => ({
  revision,
  confirmed: survey,
  shown: survey,
  pending: [],
  sending: 0,
  waiting: false,
})

export interface Stepped {
  state: QueueState
  /** Changes that no longer fit and were given up. */
  dropped: readonly SurveyChange[]
}

/** The queue after an event; pure, so that every order of events can be tried. */
export function step(state: QueueState, event: QueueEvent): Stepped {
  switch (event.type) {
    case 'performed': {
      const { change } = event
      if (state.pending.some(({ id }) => id === change.id)) return kept(state)
      return kept({
        ...state,
        pending: [...state.pending, change],
        shown: applyOperation(state.shown, change.operation),
      })
    }
    case 'sending':
      return kept({ ...state, sending: Math.min(event.count, state.pending.length), waiting: false })
    case 'held':
      return kept({ ...state, sending: 0 })
    case 'accepted': {
      const sent = state.pending.slice(0, state.sending)
      return kept({
        ...state,
        revision: event.revision,
        confirmed: applyAll(state.confirmed, sent).survey,
        pending: state.pending.slice(state.sending),
        sending: 0,
        waiting: false,
      })
    }
    case 'unreachable':
      return kept({ ...state, sending: 0, waiting: true })
    case 'reread':
      return rebase(event, state.pending)
    case 'refused': {
      const rest = rebase(event, state.pending.slice(state.sending))
      const refused = state.pending.slice(0, state.sending).filter(({ id }) => !event.seen.has(id))
      return { ...rest, dropped: [...refused, ...rest.dropped] }
    }
  }
}

const kept = (state: QueueState): Stepped => ({ state, dropped: [] })

/** What is still to be sent, made again on the survey as the server has it. */
function rebase(
  { revision, survey, seen }: { revision: number; survey: Survey; seen: ReadonlySet<string> },
  pending: readonly SurveyChange[],
): Stepped {
  const {
    survey: shown,
    fitting,
    dropped,
  } = applyAll(
    survey,
    pending.filter(({ id }) => !seen.has(id)),
  )
  return {
    state: { revision, confirmed: survey, shown, pending: fitting, sending: 0, waiting: false },
    dropped,
  }
}

function applyAll(survey: Survey, changes: readonly SurveyChange[]) {
  const fitting: SurveyChange[] = []
  const dropped: SurveyChange[] = []
  let changed = survey
  for (const change of changes) {
    try {
      changed = applyOperation(changed, change.operation)
      fitting.push(change)
    } catch (error) {
      if (!(error instanceof OperationRefused)) throw error
      dropped.push(change)
    }
  }
  return { survey: changed, fitting, dropped }
}
