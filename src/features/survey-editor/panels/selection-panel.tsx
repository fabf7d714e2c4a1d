import type { EditorActions, EditorView } from '../model/editor-context'
import { BayPanel } from './bay-panel'
import { PostPanel } from './post-panel'
import { RunPanel } from './run-panel'

export interface PanelProps {
  view: EditorView
  actions: EditorActions
}

/** The panel of whatever is selected; `onNext` goes on to the next thing that is missing. */
export function SelectionPanel({ view, actions, onNext }: PanelProps & { onNext: () => void }) {
  const { selection, survey } = view
  if (selection.kind === 'post') {
    const post = survey.posts.find(({ id }) => id === selection.id)
    if (post) return <PostPanel key={post.id} view={view} actions={actions} post={post} />
  }
  if (selection.kind === 'bay') {
    const bay = survey.bays.find(({ id }) => id === selection.id)
    if (bay) return <BayPanel key={bay.id} view={view} actions={actions} bay={bay} onNext={onNext} />
  }
  if (selection.kind === 'run') {
    const run = survey.runs.find(({ id }) => id === selection.id)
    if (run) return <RunPanel key={run.id} view={view} actions={actions} run={run} />
  }
  return <p className="text-soft">Nothing is selected.</p>
}
