import type { SurveyChange } from '@shared/endpoints/surveys'
import type { Survey } from '@shared/schemas/survey'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { ApiError } from '@/lib/api-error'
import { BATCH, newQueue, type QueueEvent, type QueueState, step } from './change-queue-step'

export interface QueueDeps {
  send: (body: { revision: number; changes: SurveyChange[] }) => Promise<{ revision: number }>
  /** The survey as the server has it now, with the ids of the changes it has seen since a revision. */
  reread: (since: number) => Promise<{ revision: number; survey: Survey; seen: ReadonlySet<string> }>
  newId: () => string
  /** Called when what is shown is no longer simply what this hand made. */
  onRebased: (survey: Survey) => void
  /** A sentence for people. */
  onTrouble: (message: string) => void
  /** Milliseconds until an unreachable server is tried again. */
  retryAfter?: number
}

/**
 * Takes changes at once and sends them in order, one request at a time. Nothing is forgotten until the server has said
 * yes: without signal it waits and tries again; after somebody else's change it makes its own again on theirs.
 */
export class ChangeQueue {
  private state: QueueState
  private readonly listeners = new Set<() => void>()
  private running: Promise<void> | undefined
  private timer: ReturnType<typeof setTimeout> | undefined
  /** The lasting trouble that was told already; it is not told again with every try. */
  private told = ''
  /** Nothing is sent once the screen is left: the next person at it would be the sender. */
  private stopped = false
  /** One by one after a refusal, so that only what the server will not have is given up. */
  private batch = BATCH

  constructor(
    { survey, revision }: { survey: Survey; revision: number },
    private readonly deps: QueueDeps,
  ) {
    this.state = newQueue(survey, revision)
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener)
    return () => this.listeners.delete(listener)
  }

  readonly getSnapshot = (): QueueState => this.state

  /** @throws OperationRefused when the change does not fit what is shown. */
  readonly perform = (operation: SurveyOperation): void => {
    this.take({ type: 'performed', change: { id: this.deps.newId(), operation } })
    this.flush()
  }

  /** Sends what is pending now; also for when the signal is back. */
  readonly flush = (): void => {
    clearTimeout(this.timer)
    if (this.stopped) return
    this.running ??= this.sendAll().finally(() => {
      this.running = undefined
    })
  }

  /** Resolves once nothing is under way: all saved, or waiting for a signal. */
  readonly settled = async (): Promise<void> => {
    while (this.running) await this.running
  }

  /** Sends no more until `start`; a request under way is not called back. */
  readonly stop = (): void => {
    this.stopped = true
    clearTimeout(this.timer)
  }

  readonly start = (): void => {
    this.stopped = false
    this.flush()
  }

  private async sendAll(): Promise<void> {
    while (this.state.pending.length > 0 && !this.stopped) {
      const changes = this.state.pending.slice(0, this.batch)
      this.take({ type: 'sending', count: this.batch })
      try {
        const { revision } = await this.deps.send({ revision: this.state.revision, changes })
        this.take({ type: 'accepted', revision })
        this.told = ''
      } catch (error) {
        if (!(await this.recover(error))) return
      }
    }
    this.batch = BATCH
  }

  /** Whether sending may go on. */
  private async recover(error: unknown): Promise<boolean> {
    const refusal = error instanceof ApiError && error.status >= 400 && error.status < 500 ? error : undefined
    if (!refusal) return this.wait()
    // Signed out, or asked too often: what is pending stays, and is sent when that is mended.
    if (refusal.status === 401 || refusal.status === 429) {
      if (this.told !== refusal.code)
        this.deps.onTrouble(`${refusal.message} ${this.count()} kept on this screen.`)
      this.told = refusal.code
      return this.wait()
    }
    if (refusal.status === 404) return this.giveUp(refusal)
    if (refusal.code !== 'survey-moved' && this.state.sending > 1) {
      this.batch = 1
      this.take({ type: 'held' })
      return true
    }
    try {
      const now = await this.deps.reread(this.state.revision)
      const moved = refusal.code === 'survey-moved'
      if (!moved) this.deps.onTrouble(`${refusal.message} It was taken back; everything else is kept.`)
      this.take({ type: moved ? 'reread' : 'refused', ...now }, moved)
      this.deps.onRebased(this.state.shown)
      return true
    } catch (failed) {
      return failed instanceof ApiError && failed.status === 404 ? this.giveUp(failed) : this.wait()
    }
  }

  /** The survey is there no more: trying again would not help. */
  private giveUp({ code, message }: ApiError): false {
    if (this.told !== code) {
      this.deps.onTrouble(
        `${message} ${this.count()} not saved, and stay${this.state.pending.length === 1 ? 's' : ''} on this screen only. Ask an owner or estimator to bring the survey back.`,
      )
    }
    this.told = code
    this.take({ type: 'unreachable' })
    return false
  }

  private wait(): false {
    this.take({ type: 'unreachable' })
    if (this.stopped) return false
    this.timer = setTimeout(this.flush, this.deps.retryAfter ?? 4000)
    return false
  }

  private count(): string {
    const { length } = this.state.pending
    return length === 1 ? 'One change is' : `${length} changes are`
  }

  private take(event: QueueEvent, tellDropped = false): void {
    const { state, dropped } = step(this.state, event)
    this.state = state
    if (tellDropped && dropped.length > 0) {
      this.deps.onTrouble(
        dropped.length === 1
          ? 'Somebody else changed the survey, and one change of yours no longer fits. It was given up; look at what is there now.'
          : `Somebody else changed the survey, and ${dropped.length} changes of yours no longer fit. They were given up; look at what is there now.`,
      )
    }
    for (const listener of this.listeners) listener()
  }
}
