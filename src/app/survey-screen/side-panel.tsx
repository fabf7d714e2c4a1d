import { ChevronDown, ChevronUp } from 'lucide-react'
import { useState } from 'react'
import { nextGap } from '@shared/survey/find-gaps'
import { IconButton } from '@/components/button'
import { classes } from '@/components/classes'
import { RectangleForm } from '@/features/survey-editor/chrome/rectangle-form'
import type { Selection } from '@/features/survey-editor/model/editor-context'
import type { EditorState } from '@/features/survey-editor/model/editor-state'
import { photoOf } from '@/features/survey-editor/model/marks'
import { selectionOfGap } from '@/features/survey-editor/model/selection'
import { NextMissing } from '@/features/survey-editor/panels/next-missing'
import { SelectionPanel } from '@/features/survey-editor/panels/selection-panel'
import type { ToolName } from '@/features/survey-editor/tools/tool-names'
import { lengthFormat } from '../length-format'
import type { SurveySession } from '../survey-session'

/** Tools that go from mark to mark. */
const tracing: ReadonlySet<ToolName> = new Set(['post', 'bay', 'stair'])

interface SidePanelProps {
  session: SurveySession
  state: EditorState
  onCutList: () => void
}

/** What is selected, and what is missing: beside the photo on a desk, a sheet below it on a phone. */
export function SidePanel({ session, state, onCutList }: SidePanelProps) {
  const { view, actions, editor } = session
  const [choice, setChoice] = useState<{ tool: ToolName; low: boolean } | null>(null)
  // While posts and bays are traced the photo keeps its room; what is chosen by hand holds until another tool is taken.
  const low = choice?.tool === state.tool ? choice.low : tracing.has(state.tool)
  const handle = (selection: Selection) => {
    editor.chooseTool('select')
    actions.select(selection)
  }
  const next = () => {
    const gap = nextGap(editor.getSnapshot().survey)
    handle(gap ? selectionOfGap(gap) : { kind: 'none' })
  }
  const { selection } = view
  const photo = photoOf(view.survey, state.photoId)
  const marked =
    state.draft?.kind === 'rectangle' && state.draft.corners.length === 4 ? state.draft.corners : null
  const isOpen = selection.kind !== 'none'
  return (
    <aside
      aria-label="Panel"
      className={classes(
        'flex shrink-0 flex-col border-t border-rule bg-card md:w-96 md:border-t-0 md:border-l',
        isOpen && !low ? 'max-h-[66%] md:max-h-none' : '',
      )}
    >
      <div className="flex items-center border-b border-rule">
        <div className="min-w-0 flex-1">
          <NextMissing view={view} actions={{ ...actions, select: handle }} onCutList={onCutList} />
        </div>
        {isOpen && (
          <IconButton
            className="md:hidden"
            label={low ? 'Raise the panel' : 'Lower the panel'}
            onClick={() => setChoice({ tool: state.tool, low: !low })}
          >
            {low ? <ChevronUp aria-hidden="true" /> : <ChevronDown aria-hidden="true" />}
          </IconButton>
        )}
      </div>
      {isOpen && (
        <div className={classes('min-h-0 flex-1 overflow-y-auto p-4', low && 'hidden md:block')}>
          {selection.kind === 'rectangle' && photo ? (
            <RectangleForm
              key={`${photo.id} ${marked ? 'marked' : 'kept'}`}
              photo={photo}
              marked={marked}
              format={lengthFormat(view.units, view.fraction)}
              actions={actions}
              canEdit={view.canEdit}
              onDone={() => {
                editor.chooseTool('select')
                actions.select({ kind: 'none' })
              }}
            />
          ) : (
            <SelectionPanel view={view} actions={actions} onNext={next} />
          )}
        </div>
      )}
    </aside>
  )
}
