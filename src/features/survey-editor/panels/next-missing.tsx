import { useState } from 'react'
import { findGaps, type Gap, nextGap } from '@shared/survey/find-gaps'
import { Button } from '@/components/button'
import { TautLine } from '@/components/taut-line'
import type { EditorActions, EditorView } from '../model/editor-context'
import { selectionOfGap } from '../model/selection'

interface NextMissingProps {
  view: EditorView
  actions: EditorActions
  onCutList: () => void
}

/** Roughly how many things a whole survey holds, for the line that tightens: one per post and bay, and what is open. */
const share = ({ survey }: EditorView, open: number): number => {
  const all = survey.posts.length + survey.bays.length
  return all === 0 ? 0 : Math.max(0, 1 - open / Math.max(all, open))
}

/** Walks through what the survey still misses; when nothing is left it leads to the cut list. */
export function NextMissing({ view, actions, onCutList }: NextMissingProps) {
  const [last, setLast] = useState<Gap>()
  const gaps = findGaps(view.survey)
  const next = nextGap(view.survey, last)
  const go = () => {
    if (!next) return
    setLast(next)
    actions.select(selectionOfGap(next))
  }
  return (
    <div className="flex items-center gap-3 px-3 py-2">
      <div className="min-w-0 flex-1">
        <TautLine share={share(view, gaps.length)} />
        <p className="line-clamp-2 text-sm" aria-live="polite">
          {next ? next.text : 'Nothing is missing.'}
        </p>
      </div>
      {next ? (
        <Button onClick={go} disabled={!next.where.bay && !next.where.post}>
          Next missing ({gaps.length})
        </Button>
      ) : (
        <Button look="primary" onClick={onCutList}>
          Cut list
        </Button>
      )}
    </div>
  )
}
