import { useState } from 'react'
import { Link, useParams } from 'react-router-dom'
import { Button } from '@/components/button'
import { Page } from '@/components/page'
import { Sheet } from '@/components/sheet'
import { ErrorNote, Loading } from '@/components/states'
import { SaveState } from '@/features/survey-editor/chrome/save-state'
import { SelectionPanel } from '@/features/survey-editor/panels/selection-panel'
import { formatOf } from '@/features/survey-editor/panels/format-of'
import { AddRows } from '@/features/survey-editor/table/add-rows'
import { BaysTable } from '@/features/survey-editor/table/bays-table'
import { CornersTable } from '@/features/survey-editor/table/corners-table'
import { Diagonals } from '@/features/survey-editor/table/diagonals-table'
import { PastePreview } from '@/features/survey-editor/table/paste-preview'
import { PostsTable } from '@/features/survey-editor/table/posts-table'
import { RunsTable } from '@/features/survey-editor/table/runs-table'
import { type Paste, usePaste } from '@/features/survey-editor/table/use-paste'
import { messageOf } from '@/lib/api-error'
import { paths } from '../paths'
import { useGoWhenSaved } from '../use-go-when-saved'
import { type Loaded, useSurveyData, useSurveySession } from '../survey-session'

/** The survey as tables: for those who would rather type, and for screen readers. */
export function Component() {
  const { surveyId = '' } = useParams()
  const { data, error, retry } = useSurveyData(surveyId)
  if (error) {
    return (
      <Page title="Survey">
        <ErrorNote message={messageOf(error)} onRetry={retry} />
      </Page>
    )
  }
  return data ? <SurveyTable key={data.record.id} loaded={data} /> : <Loading what="the survey" />
}

function SurveyTable({ loaded }: { loaded: Loaded }) {
  const { view, actions, record, queue, queueState, editor } = useSurveySession(loaded)
  const go = useGoWhenSaved(queue)
  const [paste, setPaste] = useState<Paste | null>(null)
  const { lines, apply } = usePaste(view, actions, paste)
  const { selection, survey, canEdit } = view
  const panel = { view, actions }
  const { canUndo, canRedo } = editor.getSnapshot()
  const begin = (target: Paste['target']) => (row: string, given: string[]) =>
    setPaste({ target, row, lines: given })
  return (
    <Page
      title={survey.title}
      above={
        <>
          <Link to={paths.job(record.jobId)}>{record.jobTitle}</Link>{' '}
          <SaveState unsent={queueState.pending.length} waiting={queueState.waiting} />
        </>
      }
      actions={
        <>
          <Button disabled={!canUndo} onClick={actions.undo}>
            Undo
          </Button>
          <Button disabled={!canRedo} onClick={actions.redo}>
            Redo
          </Button>
          <Button onClick={() => go(paths.survey(record.id))}>Photo</Button>
          <Button onClick={() => go(paths.cutList(record.id))}>Cut list</Button>
        </>
      }
    >
      <div className="flex flex-col gap-6">
        {canEdit ? <AddRows {...panel} /> : null}
        <Section title="Posts">
          <PostsTable
            {...panel}
            onPaste={(column, row, given) => begin({ kind: 'size', column })(row, given)}
          />
        </Section>
        <Section title="Bays and readings">
          <BaysTable
            {...panel}
            onPaste={(place, row, given) => begin({ kind: 'reading', place })(row, given)}
          />
        </Section>
        <Section title="Runs">
          <RunsTable {...panel} />
        </Section>
        <Section title="Corners">
          <CornersTable {...panel} />
        </Section>
        <Section title="Diagonals">
          <Diagonals {...panel} />
        </Section>
      </div>
      <Sheet
        open={selection.kind === 'bay' || selection.kind === 'run'}
        onOpenChange={() => actions.select({ kind: 'none' })}
        title={'id' in selection ? selection.id : ''}
      >
        <SelectionPanel {...panel} onNext={() => actions.select({ kind: 'none' })} />
      </Sheet>
      <Sheet open={paste !== null} onOpenChange={() => setPaste(null)} title="Pasted lengths" place="middle">
        <PastePreview
          lines={lines}
          format={formatOf(view)}
          onDrop={() => setPaste(null)}
          onApply={() => {
            apply()
            setPaste(null)
          }}
        />
      </Sheet>
    </Page>
  )
}

function Section({ title, children }: { title: string; children: React.ReactNode }) {
  return (
    <section aria-label={title}>
      <h2 className="mb-2 text-lg font-semibold">{title}</h2>
      {children}
    </section>
  )
}
