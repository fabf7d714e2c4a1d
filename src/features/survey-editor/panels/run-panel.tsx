import type { CableLayout, Run } from '@shared/schemas/run'
import { divideRun } from '@shared/survey/divide-run'
import { toPoundsForce, newtons, poundsForce } from '@shared/units/force'
import { inches } from '@shared/units/length'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { SelectField, TextField } from '@/components/field'
import { sayDone } from '@/components/toast'
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

/** One run: its cable, tension and layout, and an overall reading where one was taken. */
export function RunPanel({ view, actions, run }: PanelProps & { run: Run }) {
  const { canEdit, hardware } = view
  const set = (cables: CableLayout) =>
    actions.perform({ type: 'run.set', id: run.id, set: { cables }, unset: [] })
  const spacing = 'layout' in run.cables ? run.cables.spacing : inches(3)
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
        onChange={(layout) => set(layout === 'heights' ? { heights: [spacing] } : { layout, spacing })}
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
  const shown = (force: number) => Number((units.force === 'lbf' ? toPoundsForce(force) : force).toFixed(2))
  const keep = (text: string, number: number) => {
    if (text === '') {
      if (run.tension !== undefined)
        actions.perform({ type: 'run.set', id: run.id, set: {}, unset: ['tension'] })
      return
    }
    if (!(number > 0)) return
    const tension = units.force === 'lbf' ? poundsForce(number) : newtons(number)
    if (tension !== run.tension) actions.perform({ type: 'run.set', id: run.id, set: { tension }, unset: [] })
  }
  return (
    <TextField
      key={run.tension ?? 'house'}
      label={`Tension, ${units.force}`}
      hint={`left empty: the house’s ${shown(rules.tension)} ${units.force}`}
      type="number"
      min={0}
      step="any"
      inputMode="decimal"
      defaultValue={run.tension === undefined ? '' : shown(run.tension)}
      disabled={!canEdit}
      onBlur={(event) => keep(event.target.value, event.target.valueAsNumber)}
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
