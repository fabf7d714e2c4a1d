import { useQuery } from '@tanstack/react-query'
import { useBlocker } from 'react-router-dom'
import { useEffect, useMemo, useState, useSyncExternalStore } from 'react'
import { surveyFindings } from '@shared/calculation/survey-findings'
import type { OwnGuardRules } from '@shared/schemas/catalogue'
import type { GuardRules } from '@shared/schemas/guard-rules'
import type { Hardware } from '@shared/schemas/hardware'
import type { HouseRules } from '@shared/schemas/house-rules'
import type { PhotoRecord, SurveyRecord } from '@shared/schemas/survey-record'
import { askBefore, sayProblem } from '@/components/toast'
import { guardRulesQuery } from '@/features/guard-rules/api/list-guard-rules'
import { hardwareQuery } from '@/features/hardware/api/read-hardware'
import { houseRulesQuery } from '@/features/hardware/api/read-house-rules'
import { usableHardware } from '@/features/hardware/usable-hardware'
import { useMay, useSession } from '@/features/session/session'
import { Editor } from '@/features/survey-editor/model/editor'
import type { Viewport } from '@/features/survey-editor/model/camera'
import type { EditorActions, EditorView } from '@/features/survey-editor/model/editor-context'
import { changeSurvey } from '@/features/surveys/api/change-survey'
import { readHistory } from '@/features/surveys/api/read-history'
import { readSurvey, surveyQuery } from '@/features/surveys/api/read-survey'
import { ChangeQueue } from '@/features/surveys/change-queue'
import type { QueueState } from '@/features/surveys/change-queue-step'

import { proposeRunsOf } from './propose-runs-of'

/** One survey in hand: what its screens show and do, and how far it is saved. */
export interface SurveySession {
  record: SurveyRecord
  editor: Editor
  queue: ChangeQueue
  queueState: QueueState
  view: EditorView
  actions: EditorActions
  /** Photos of the survey, those added since it was opened too. */
  photos: readonly PhotoRecord[]
  addPhotoRecord: (photo: PhotoRecord) => void
}

export interface Loaded {
  record: SurveyRecord
  hardware: Hardware
  rules: HouseRules
  /** The company’s own, retired ones too: a survey may name them still. */
  guardRules: GuardRules[]
  retiredRules: ReadonlySet<string>
}

/** What a survey's screens need before they can begin; `stale` says why what is shown could not be read again. */
export function useSurveyData(surveyId: string) {
  const record = useQuery(surveyQuery(surveyId))
  const catalogue = useQuery(hardwareQuery)
  const rules = useQuery(houseRulesQuery)
  const own = useQuery(guardRulesQuery)
  const error = record.error ?? catalogue.error ?? rules.error ?? own.error
  const survey = record.data?.survey
  const hardware = useMemo(
    () => (catalogue.data && survey ? usableHardware(catalogue.data, survey) : undefined),
    [catalogue.data, survey],
  )
  const retry = () => {
    for (const query of [record, catalogue, rules, own]) if (query.error) void query.refetch()
  }
  const ownRules = useMemo(() => own.data && splitRules(own.data), [own.data])
  const data: Loaded | undefined =
    record.data && hardware && rules.data && ownRules
      ? { record: record.data, hardware, rules: rules.data, ...ownRules }
      : undefined
  return { data, error: data ? null : error, stale: data ? error : null, readAt: record.dataUpdatedAt, retry }
}

const splitRules = (own: readonly OwnGuardRules[]): Pick<Loaded, 'guardRules' | 'retiredRules'> => ({
  guardRules: own.map(({ rules }) => rules),
  retiredRules: new Set(own.flatMap(({ retired, rules }) => (retired ? [rules.id] : []))),
})

/** Opens a survey for editing; what is loaded afterwards does not disturb the copy in hand. */
export function useSurveySession(loaded: Loaded): SurveySession {
  const { person, company } = useSession()
  const canEdit = useMay('survey:edit')
  const [photos, setPhotos] = useState<readonly PhotoRecord[]>(loaded.record.photos)
  const [{ editor, queue }] = useState(() => open(loaded, canEdit))
  const state = useSyncExternalStore(editor.subscribe, editor.getSnapshot)
  const queueState = useSyncExternalStore(queue.subscribe, queue.getSnapshot)
  useSendOnReturn(queue)
  useWarnBeforeLeaving(queueState)
  const { survey, selection } = state
  const findings = useMemo(
    () =>
      surveyFindings({
        survey,
        hardware: loaded.hardware,
        rules: loaded.rules,
        guardRules: loaded.guardRules,
      }),
    [survey, loaded],
  )
  const view = useMemo<EditorView>(
    () => ({
      survey,
      selection,
      hardware: loaded.hardware,
      rules: loaded.rules,
      guardRules: loaded.guardRules,
      retiredRules: loaded.retiredRules,
      findings,
      units: survey.units,
      fraction: company.fraction,
      person: { name: person.name },
      canEdit,
    }),
    [survey, selection, findings, loaded, company.fraction, person.name, canEdit],
  )
  const addPhotoRecord = (photo: PhotoRecord) => {
    setPhotos((known) => {
      const all = [...known, photo]
      editor.receive(editor.getSnapshot().survey, pictureSizes(all))
      return all
    })
  }
  return { record: loaded.record, editor, queue, queueState, view, actions: editor, photos, addPhotoRecord }
}

function open({ record, hardware, rules }: Loaded, canEdit: boolean) {
  const queue: ChangeQueue = new ChangeQueue(record, {
    send: (body) => changeSurvey(record.id, body),
    reread: (since) => reread(record.id, since),
    newId: () => crypto.randomUUID(),
    onRebased: (survey) => editor.receive(survey),
    onTrouble: sayProblem,
  })
  const editor = new Editor({
    survey: record.survey,
    pictures: pictureSizes(record.photos),
    canEdit,
    onOperation: queue.perform,
    onRefusal: sayProblem,
    runsFor: proposeRunsOf({ hardware, rules }),
  })
  return { editor, queue }
}

const pictureSizes = (photos: readonly PhotoRecord[]): ReadonlyMap<string, Viewport> =>
  new Map(photos.map(({ surveyPhotoId, width, height }) => [surveyPhotoId, { width, height }]))

/** The survey now, and the changes the server has seen since a revision. */
async function reread(surveyId: string, since: number) {
  const seen = new Set<string>()
  let before: number | null = null
  do {
    const page: Awaited<ReturnType<typeof readHistory>> = await readHistory(
      surveyId,
      before === null ? { limit: 200 } : { before, limit: 200 },
    )
    const fresh = page.entries.filter(({ revision }) => revision > since)
    for (const { changeId } of fresh) seen.add(changeId)
    before = fresh.length === page.entries.length ? page.next : null
  } while (before !== null)
  const { revision, survey } = await readSurvey(surveyId)
  return { revision, survey, seen }
}

function useSendOnReturn(queue: ChangeQueue): void {
  useEffect(() => {
    queue.start()
    window.addEventListener('online', queue.flush)
    return () => {
      window.removeEventListener('online', queue.flush)
      queue.stop()
    }
  }, [queue])
}

/**
 * Nothing unsent is dropped by leaving. The browser asks before it closes the tab; another page of ours waits until all
 * is sent, and without signal it asks.
 */
function useWarnBeforeLeaving({ pending: { length: unsent }, waiting }: QueueState): void {
  useEffect(() => {
    if (unsent === 0) return
    const warn = (event: BeforeUnloadEvent) => event.preventDefault()
    window.addEventListener('beforeunload', warn)
    return () => window.removeEventListener('beforeunload', warn)
  }, [unsent])
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => unsent > 0 && currentLocation.pathname !== nextLocation.pathname,
  )
  useEffect(() => {
    if (blocker.state !== 'blocked') return
    if (unsent === 0) {
      blocker.proceed()
      return
    }
    if (!waiting) return
    const changes = unsent === 1 ? 'One change has' : `${unsent} changes have`
    return askBefore(`${changes} not been sent yet and would be lost. Stay here until there is signal.`, {
      label: 'Leave all the same',
      onGo: blocker.proceed,
      onStay: blocker.reset,
    })
  }, [blocker, unsent, waiting])
}
