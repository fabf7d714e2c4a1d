import { useState } from 'react'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import type { CableLayout, Run } from '@shared/schemas/run'
import { divideRun } from '@shared/survey/divide-run'
import { writeForce } from '@shared/units/format-force'
import { inches, type Length, nanometres } from '@shared/units/length'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { SelectField } from '@/components/field'
import { ForceField } from '@/components/force-field'
import { sayDone } from '@/components/toast'
import type { EditorView } from '../model/editor-context'
import { formatOf } from './format-of'
import { HeightsField } from './heights-field'
import { Readings } from './readings'
import { MeasureField } from './measure-field'
import { PanelFindings } from './panel-findings'
import type { PanelProps } from './selection-panel'

const layouts = [
  { value: 'even', label: 'Even' },
  { value: 'fixed', label: 'Fixed pitch' },
  { value: 'heights', label: 'At heights' },
] as const

const layoutOf = (cables: CableLayout) => ('layout' in cables ? cables.layout : 'heights')

/** Where the run's cables stand now, to begin from when they are given one by one. */
function heightsNow({ survey, hardware, rules }: EditorView, run: Run): Length[] {
  const found = calculateSurvey({ survey, hardware, rules }).runs.find((each) => each.run === run.id)
  const heights = found?.cables.map(({ height }) => nanometres(Math.round(height))) ?? []
  return heights.length > 0 ? heights : [inches(3)]
}

/** One run: its cable, tension and layout, and an overall reading where one was taken. */
export function RunPanel({ view, actions, run }: PanelProps & { run: Run }) {
  const { canEdit, hardware } = view
  const set = (cables: CableLayout) =>
    actions.perform({ type: 'run.set', id: run.id, set: { cables }, unset: [] })
  // What was set before the layout was changed comes back when it is changed back.
  const [before, setBefore] = useState<{ spacing?: Length; heights?: Length[] }>({})
  const setLayout = (layout: 'even' | 'fixed' | 'heights') => {
    if ('layout' in run.cables) {
      setBefore((known) => ({ ...known, spacing: 'layout' in run.cables ? run.cables.spacing : undefined }))
      set(
        layout === 'heights'
          ? { heights: before.heights ?? heightsNow(view, run) }
          : { ...run.cables, layout },
      )
    } else if (layout !== 'heights') {
      setBefore((known) => ({ ...known, heights: 'heights' in run.cables ? run.cables.heights : undefined }))
      set({ layout, spacing: before.spacing ?? inches(3) })
    }
  }
  return (
    <section aria-label={`Run ${run.id}`} className="flex flex-col gap-4">
      <h2 className="text-lg font-semibold">
        Run {run.id}: {run.bays.join(', ')}
      </h2>
      <SelectField
        label="Cable"
        value={run.cable}
        disabled={!canEdit}
        onChange={(event) =>
          actions.perform({ type: 'run.set', id: run.id, set: { cable: event.target.value }, unset: [] })
        }
      >
        {hardware.cables.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <ChoiceGroup
        label="Layout of the cables"
        choices={layouts}
        value={layoutOf(run.cables)}
        disabled={!canEdit}
        onChange={setLayout}
      />
      {'layout' in run.cables ? (
        <MeasureField
          label="Spacing at most, square to the cable"
          required
          value={run.cables.spacing}
          format={formatOf(view)}
          disabled={!canEdit}
          onChange={(given) => {
            if (given !== undefined && given > 0 && 'layout' in run.cables)
              set({ ...run.cables, spacing: given })
          }}
        />
      ) : (
        <HeightsField view={view} heights={run.cables.heights} onChange={(heights) => set({ heights })} />
      )}
      <TensionField view={view} actions={actions} run={run} />
      <details>
        <summary className="min-h-12 py-3 font-medium">Overall reading, end post to end post</summary>
        <p className="mb-2 text-sm text-soft">
          Where the whole run was taped in one go, the cut list uses this and checks the bays against it.
        </p>
        <Readings view={view} actions={actions} of={{ kind: 'run', id: run.id }} readings={run.readings} />
      </details>
      <PanelFindings view={view} of={{ kind: 'run', id: run.id }} />
      {canEdit && <RunChanges view={view} actions={actions} run={run} />}
    </section>
  )
}

function TensionField({ view, actions, run }: PanelProps & { run: Run }) {
  const { units, rules, canEdit } = view
  return (
    <ForceField
      label="Tension"
      hint={`left empty: the house’s ${writeForce(rules.tension, units.force)}`}
      unit={units.force}
      value={run.tension}
      disabled={!canEdit}
      onChange={(tension) =>
        actions.perform({
          type: 'run.set',
          id: run.id,
          set: tension === undefined ? {} : { tension },
          unset: tension === undefined ? ['tension'] : [],
        })
      }
    />
  )
}

/** Ending a run at one of its posts, or taking it away. */
function RunChanges({ view, actions, run }: PanelProps & { run: Run }) {
  const { survey } = view
  const splitAfter = (index: number) => {
    const parts = [run.bays.slice(0, index), run.bays.slice(index)]
    const taken = new Set(survey.runs.map(({ id }) => id))
    actions.perform({ type: 'group', operations: divideRun(survey, { run, parts }, taken) })
    sayDone(`Run ${run.id} divided.`, actions.undo)
  }
  const remove = () => {
    actions.perform({ type: 'run.remove', id: run.id })
    sayDone(`Run ${run.id} removed.`, actions.undo)
  }
  return (
    <div className="flex flex-wrap gap-2">
      {run.bays.slice(1).map((bay, i) => (
        <Button key={bay} onClick={() => splitAfter(i + 1)}>
          End it before {bay}
        </Button>
      ))}
      <Button look="danger" onClick={remove}>
        Remove run
      </Button>
    </div>
  )
}
