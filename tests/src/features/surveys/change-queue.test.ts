import { describe, expect, it, vi } from 'vitest'
import type { SurveyChange } from '@shared/endpoints/surveys'
import type { Survey } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { newSurvey } from '@shared/survey/new-survey'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { ChangeQueue } from '../../../../src/features/surveys/change-queue'
import { ApiError, offline } from '../../../../src/lib/api-error'

const post = (id: string): SurveyOperation => ({ type: 'post.add', post: { id } })
const ids = (survey: Survey) => survey.posts.map(({ id }) => id)

/** A server of one survey that can be out of reach, lose answers, and be changed by others. */
class FakeServer {
  survey = newSurvey('Deck', { length: 'in', force: 'lbf' })
  made: { id: string; revision: number }[] = []
  revision = 0
  reachable = true
  losesAnswers = false
  refuses: ApiError | undefined
  requests = 0

  readonly send = ({ revision, changes }: { revision: number; changes: SurveyChange[] }) => {
    this.requests += 1
    if (!this.reachable) return Promise.reject(offline())
    if (this.refuses) return Promise.reject(this.refuses)
    const fresh = changes.filter(({ id }) => !this.made.some((known) => known.id === id))
    const own = this.made.filter(
      ({ id, revision: at }) => at > revision && changes.some((c) => c.id === id),
    ).length
    if (fresh.length > 0 && this.revision !== revision + own) {
      return Promise.reject(new ApiError('survey-moved', 409, 'The survey has moved on.'))
    }
    if (fresh.some(({ operation }) => operation.type === 'survey.set')) {
      return Promise.reject(new ApiError('operation-refused', 409, 'The title cannot be that.'))
    }
    for (const { id, operation } of fresh) this.change(operation, id)
    if (this.losesAnswers) return Promise.reject(offline())
    return Promise.resolve({ revision: this.revision })
  }

  readonly reread = (since: number) =>
    Promise.resolve({
      revision: this.revision,
      survey: this.survey,
      seen: new Set(this.made.filter(({ revision }) => revision > since).map(({ id }) => id)),
    })

  change(operation: SurveyOperation, id = `other-${this.revision}`): void {
    this.survey = applyOperation(this.survey, operation)
    this.revision += 1
    this.made.push({ id, revision: this.revision })
  }
}

function queueOn(server: FakeServer) {
  let made = 0
  const onTrouble = vi.fn<(message: string) => void>()
  const onRebased = vi.fn<(survey: Survey) => void>()
  const queue = new ChangeQueue(server, {
    send: server.send,
    reread: server.reread,
    newId: () => `change-${(made += 1)}`,
    onRebased,
    onTrouble,
    retryAfter: 1e6,
  })
  return { queue, onTrouble, onRebased }
}

describe('ChangeQueue', () => {
  it('shows changes at once and sends them in order, one request at a time', async () => {
    const server = new FakeServer()
    const { queue } = queueOn(server)
    for (const id of ['P1', 'P2', 'P3']) queue.perform(post(id))
    expect(ids(queue.getSnapshot().shown)).toEqual(['P1', 'P2', 'P3'])
    await queue.settled()
    expect(ids(server.survey)).toEqual(['P1', 'P2', 'P3'])
    expect(queue.getSnapshot()).toMatchObject({ pending: [], revision: 3, waiting: false })
    expect(server.requests).toBeLessThanOrEqual(2)
  })

  it('keeps everything without signal and sends it when that is back', async () => {
    const server = new FakeServer()
    server.reachable = false
    const { queue } = queueOn(server)
    queue.perform(post('P1'))
    queue.perform(post('P2'))
    await queue.settled()
    expect(queue.getSnapshot()).toMatchObject({ waiting: true, pending: { length: 2 } })
    server.reachable = true
    queue.flush()
    await queue.settled()
    expect(ids(server.survey)).toEqual(['P1', 'P2'])
    queue.stop()
  })

  it('does nothing twice when only the answer was lost', async () => {
    const server = new FakeServer()
    server.losesAnswers = true
    const { queue } = queueOn(server)
    queue.perform(post('P1'))
    await queue.settled()
    server.losesAnswers = false
    queue.perform(post('P2'))
    await queue.settled()
    expect(ids(server.survey)).toEqual(['P1', 'P2'])
    expect(queue.getSnapshot().pending).toEqual([])
    queue.stop()
  })

  it('makes its changes again on what somebody else did, even when its own answer was lost before', async () => {
    const server = new FakeServer()
    server.losesAnswers = true
    const { queue, onRebased, onTrouble } = queueOn(server)
    queue.perform(post('P1'))
    await queue.settled()
    server.losesAnswers = false
    server.change(post('P9'))
    queue.perform(post('P2'))
    await queue.settled()
    expect(ids(server.survey)).toEqual(['P1', 'P9', 'P2'])
    expect(queue.getSnapshot().shown).toEqual(server.survey)
    expect(onRebased).toHaveBeenCalledOnce()
    expect(onTrouble).not.toHaveBeenCalled()
    queue.stop()
  })

  it('gives up, with a word, only what no longer fits', async () => {
    const server = new FakeServer()
    const { queue, onTrouble } = queueOn(server)
    server.change(post('P1'))
    queue.perform(post('P1'))
    queue.perform(post('P2'))
    await queue.settled()
    expect(ids(server.survey)).toEqual(['P1', 'P2'])
    expect(onTrouble).toHaveBeenCalledWith(expect.stringContaining('one change of yours'))
  })

  it('takes back what the server refuses and keeps the rest', async () => {
    const server = new FakeServer()
    const { queue, onTrouble } = queueOn(server)
    queue.perform(post('P1'))
    await queue.settled()
    server.reachable = false
    queue.perform(post('P2'))
    queue.perform({ type: 'survey.set', set: { title: 'Porch' }, unset: [] })
    queue.perform(post('P3'))
    await queue.settled()
    server.reachable = true
    queue.flush()
    await queue.settled()
    expect(onTrouble).toHaveBeenCalledWith(expect.stringContaining('The title cannot be that.'))
    expect(ids(server.survey)).toEqual(['P1', 'P2', 'P3'])
    expect(queue.getSnapshot().shown).toEqual(server.survey)
  })

  it('tells once, not with every try, that somebody is signed out, and keeps their changes', async () => {
    const server = new FakeServer()
    const { queue, onTrouble } = queueOn(server)
    server.refuses = new ApiError('not-signed-in', 401, 'Sign in to go on.')
    queue.perform(post('P1'))
    await queue.settled()
    queue.flush()
    await queue.settled()
    expect(onTrouble).toHaveBeenCalledExactlyOnceWith('Sign in to go on. One change is kept on this screen.')
    server.refuses = undefined
    queue.flush()
    await queue.settled()
    expect(ids(server.survey)).toEqual(['P1'])
    queue.stop()
  })
})

describe('a survey that was put away meanwhile', () => {
  it('keeps what is unsent, says so once and stops asking by itself', async () => {
    vi.useFakeTimers()
    const server = new FakeServer()
    const { queue, onTrouble } = queueOn(server)
    server.refuses = new ApiError('not-found', 404, 'There is no such survey.')
    queue.perform(post('P1'))
    await queue.settled()
    await vi.advanceTimersByTimeAsync(1e7)
    expect(server.requests).toBe(1)
    queue.flush()
    await queue.settled()
    expect(onTrouble).toHaveBeenCalledTimes(1)
    expect(onTrouble.mock.calls[0]?.[0]).toMatch(/no such survey.*One change is not saved/)
    expect(ids(queue.getSnapshot().shown)).toEqual(['P1'])
    vi.useRealTimers()
  })
})

describe('a queue that was stopped', () => {
  it('sends nothing more, not even when the signal is back, until it is started again', async () => {
    const server = new FakeServer()
    const { queue } = queueOn(server)
    server.reachable = false
    queue.perform(post('P1'))
    await queue.settled()
    queue.stop()
    server.reachable = true
    queue.flush()
    await queue.settled()
    expect(server.revision).toBe(0)
    queue.start()
    await queue.settled()
    expect(ids(server.survey)).toEqual(['P1'])
  })

  it('does not begin another request after the one under way', async () => {
    const server = new FakeServer()
    const { queue } = queueOn(server)
    queue.perform(post('P1'))
    queue.perform(post('P2'))
    queue.stop()
    await queue.settled()
    expect(server.requests).toBe(1)
  })
})
