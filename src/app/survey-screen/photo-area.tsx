import type { ReactNode } from 'react'
import { EmptyState } from '@/components/states'
import { sayProblem } from '@/components/toast'
import { AddPhoto } from '@/features/survey-editor/chrome/add-photo'
import { PhotoStrip } from '@/features/survey-editor/chrome/photo-strip'
import { UnsentPhotos } from '@/features/survey-editor/chrome/unsent-photos'
import { PlacingStrip } from '@/features/survey-editor/chrome/placing-strip'
import type { EditorState } from '@/features/survey-editor/model/editor-state'
import { photoOf, unplacedPosts } from '@/features/survey-editor/model/marks'
import { thumbnailAddress } from '@/features/surveys/api/add-photo'
import { ButtonLink } from '@/components/button'
import { paths } from '../paths'
import type { SurveySession } from '../survey-session'
import { useAddPhoto } from './use-add-photo'

interface PhotoAreaProps {
  session: SurveySession
  state: EditorState
  /** The canvas. */
  children: ReactNode
}

/** The photo with what lies over it: photos to choose from, posts to place, and the tool's word on what it waits for. */
export function PhotoArea({ session, state, children }: PhotoAreaProps) {
  const { editor, view, photos } = session
  const { progress, unsent, store, sendAgain, giveUp } = useAddPhoto(session)
  const adding = { onFile: store, onFault: sayProblem, progress }
  const waiting = (
    <UnsentPhotos photos={unsent} busy={progress !== null} onSend={sendAgain} onRemove={giveUp} />
  )
  if (state.photoId === null) {
    return (
      <div className="flex flex-1 flex-col items-center justify-center gap-4 p-4">
        {waiting}
        <EmptyState
          title="No photo yet"
          action={view.canEdit ? <AddPhoto {...adding} look="first" /> : undefined}
        >
          <p>Stand where you see the whole guard and take a photo; then put the posts on it.</p>
          <p className="mt-2">
            <ButtonLink look="quiet" to={paths.surveyTable(session.record.id)}>
              Or type the survey as a table
            </ButtonLink>
          </p>
        </EmptyState>
      </div>
    )
  }
  const placeable =
    state.tool === 'post' ? unplacedPosts(view.survey, photoOf(view.survey, state.photoId)) : []
  const thumbnails = new Map(photos.map((photo) => [photo.surveyPhotoId, thumbnailAddress(photo.id)]))
  return (
    <div className="relative min-h-40 min-w-0 flex-1">
      {children}
      <div className="pointer-events-none absolute inset-x-2 top-2 flex flex-col items-start gap-2 *:pointer-events-auto">
        <div className="flex max-w-full flex-wrap gap-2">
          <PhotoStrip
            photos={view.survey.photos.map(({ id }) => ({ id, thumbnail: thumbnails.get(id) ?? null }))}
            current={state.photoId}
            onChoose={editor.choosePhoto}
          />
          {view.canEdit && <AddPhoto {...adding} look="further" />}
        </div>
        {waiting}
        <div className="max-w-full">
          <PlacingStrip posts={placeable} placing={state.placing} onPlace={editor.setPlacing} />
        </div>
      </div>
      <p
        aria-live="polite"
        hidden={state.tool === 'select' && state.selection.kind !== 'none' && state.draft === null}
        className="pointer-events-none absolute bottom-2 left-1/2 max-w-[92%] -translate-x-1/2 rounded bg-card/95 px-3 py-1 text-center text-sm"
      >
        {state.hint}
      </p>
    </div>
  )
}
