import { lazy, Suspense, useEffect, useEffectEvent, useState, useSyncExternalStore } from 'react'
import { useSearchParams } from 'react-router-dom'
import { standingStops } from '@shared/survey/overrule'
import { Sheet } from '@/components/sheet'
import { Loading } from '@/components/states'
import { sayDone, sayProblem } from '@/components/toast'
import { EditorBar } from '@/features/survey-editor/chrome/editor-bar'
import { KeysList } from '@/features/survey-editor/chrome/keys-list'
import { useKeys } from '@/features/survey-editor/chrome/use-keys'
import { ToolRail } from '@/features/survey-editor/chrome/tool-rail'
import { SurveyPanel } from '@/features/survey-editor/panels/survey-panel'
import { pictureAddress } from '@/features/surveys/api/add-photo'
import { useWakeLock } from '@/lib/wake-lock'
import { OfflineBanner } from '../offline-banner'
import { paths } from '../paths'
import { type Loaded, type SurveySession, useSurveySession } from '../survey-session'
import { useGoWhenSaved } from '../use-go-when-saved'
import { PhotoArea } from './photo-area'
import { SidePanel } from './side-panel'
import { useCaptions } from './use-captions'

const PhotoCanvas = lazy(() => import('@/features/survey-editor/canvas/photo-canvas'))
const pictureFailed = () =>
  sayProblem(
    'The photo could not be fetched. Check the signal and open the survey again; its marks are kept.',
  )

/** The editor's screen: photo in the middle, tools and panel around it; under the thumb on a phone. */
export function SurveyScreen({ loaded }: { loaded: Loaded }) {
  const session = useSurveySession(loaded)
  const { editor, queueState, view, actions, record } = session
  const state = useSyncExternalStore(editor.subscribe, editor.getSnapshot)
  const [sheet, setSheet] = useState<'settings' | 'keys' | null>(null)
  const captions = useCaptions(view)
  const go = useGoWhenSaved(session.queue)
  const toCutList = () => go(paths.cutList(record.id))
  useKeys(editor)
  useWakeLock()
  useOpenAt(session, () => setSheet('settings'))
  useQuestionMark(() => setSheet('keys'))
  useEffect(() => {
    document.title = `${view.survey.title} · Tautbook`
  }, [view.survey.title])
  const photo = session.photos.find(({ surveyPhotoId }) => surveyPhotoId === state.photoId)
  return (
    <div className="fixed inset-0 flex flex-col bg-paper">
      <EditorBar
        title={view.survey.title}
        back={{ to: paths.job(record.jobId), label: `Back to job ${record.jobNumber}` }}
        saving={{ unsent: queueState.pending.length, waiting: queueState.waiting }}
        undo={state.canUndo ? actions.undo : null}
        redo={state.canRedo ? actions.redo : null}
        onTable={() => go(paths.surveyTable(record.id))}
        onHistory={() => go(paths.surveyHistory(record.id))}
        onCutList={toCutList}
        onFindings={() => go(paths.findings(record.id))}
        found={foundText(view)}
        onSettings={() => setSheet('settings')}
        onKeys={() => setSheet('keys')}
        onRemovePhoto={
          view.canEdit && state.photoId !== null ? () => removePhoto(session, state.photoId) : null
        }
      />
      <OfflineBanner />
      <div className="flex min-h-0 flex-1 flex-col-reverse md:flex-row">
        <ToolRail editor={editor} tool={state.tool} canEdit={view.canEdit} />
        <main className="flex min-h-0 min-w-0 flex-1 flex-col md:flex-row" id="content">
          <PhotoArea session={session} state={state}>
            <Suspense fallback={<Loading what="the photo" />}>
              <PhotoCanvas
                editor={editor}
                captions={captions}
                picture={photo ? pictureAddress(photo.id) : null}
                onPictureFailed={pictureFailed}
              />
            </Suspense>
          </PhotoArea>
          <SidePanel session={session} state={state} onCutList={toCutList} />
        </main>
      </div>
      <Sheet open={sheet === 'settings'} onOpenChange={() => setSheet(null)} title="Guard and units">
        <SurveyPanel view={view} actions={actions} />
      </Sheet>
      <Sheet open={sheet === 'keys'} onOpenChange={() => setSheet(null)} title="Keys">
        <KeysList />
      </Sheet>
    </div>
  )
}

/** What is to be looked at, in brackets behind a name; nothing where there is nothing or all was let pass. */
function foundText({ survey, findings }: SurveySession['view']): string {
  const counts = {
    stop: standingStops(survey, findings).length,
    check: findings.filter(({ level }) => level === 'check').length,
  }
  const parts = (['stop', 'check'] as const).flatMap((level) => {
    const count = counts[level]
    return count === 0 ? [] : [`${count} ${level}${count === 1 ? '' : 's'}`]
  })
  return parts.length === 0 ? '' : ` (${parts.join(', ')})`
}

/** Takes a photo with its marks out of the survey; the posts stay. */
function removePhoto({ editor, actions }: SurveySession, photoId: string | null): void {
  if (photoId === null) return
  editor.perform({ type: 'photo.remove', id: photoId })
  sayDone(`Photo ${photoId} removed, with its marks; the posts stay.`, actions.undo)
}

/** An address with `?bay=B2` opens the survey with that in hand, one with `?guard` its guard: where a finding leads. */
function useOpenAt({ actions }: SurveySession, openGuard: () => void): void {
  const [search] = useSearchParams()
  const { select } = actions
  useEffect(() => {
    for (const kind of ['bay', 'post', 'run'] as const) {
      const id = search.get(kind)
      if (id) select({ kind, id })
    }
  }, [search, select])
  const openNow = useEffectEvent(openGuard)
  useEffect(() => {
    if (search.has('guard')) openNow()
  }, [search])
}

function useQuestionMark(show: () => void): void {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      const typing = event.target instanceof HTMLElement && event.target.matches('input, textarea, select')
      if (event.key === '?' && !typing) show()
    }
    window.addEventListener('keydown', press)
    return () => window.removeEventListener('keydown', press)
  })
}
