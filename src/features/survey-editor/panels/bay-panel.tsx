import type { Bay } from '@shared/schemas/bay'
import { removeBays } from '@shared/survey/remove-bay'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { sayDone } from '@/components/toast'
import { NumberBox } from './number-box'
import { PanelFindings } from './panel-findings'
import type { PanelProps } from './selection-panel'
import { Readings } from './readings'
import { StairFields } from './stair-fields'

const kinds = [
  { value: 'level', label: 'Level' },
  { value: 'stair', label: 'Stair' },
] as const

/** One bay: its readings first, since that is what is taken on site, then what it is. */
export function BayPanel({ view, actions, bay, onNext }: PanelProps & { bay: Bay; onNext: () => void }) {
  const { canEdit, survey } = view
  const run = survey.runs.find(({ bays }) => bays.includes(bay.id))
  const set = (changes: Partial<Pick<Bay, 'kind' | 'spacers' | 'skewFrom' | 'skewTo'>>) =>
    actions.perform({ type: 'bay.set', id: bay.id, set: changes, unset: [] })
  const remove = () => {
    actions.perform(removeBays(survey, [bay.id]))
    sayDone(`Bay ${bay.id} removed.`, actions.undo)
  }
  return (
    <section aria-label={`Bay ${bay.id}`} className="flex flex-col gap-4">
      <div className="flex flex-wrap items-baseline justify-between gap-2">
        <h2 className="text-lg font-semibold">
          Bay {bay.id}, {bay.from} to {bay.to}
        </h2>
        {run ? (
          <Button look="quiet" onClick={() => actions.select({ kind: 'run', id: run.id })}>
            Run {run.id}
          </Button>
        ) : null}
      </div>
      <Readings
        view={view}
        actions={actions}
        of={{ kind: 'bay', id: bay.id }}
        readings={bay.readings}
        onComplete={onNext}
      />
      <ChoiceGroup
        label="This bay is"
        choices={kinds}
        value={bay.kind}
        disabled={!canEdit}
        onChange={(kind) => actions.performAndLay({ type: 'bay.set', id: bay.id, set: { kind }, unset: [] })}
      />
      {bay.kind === 'stair' ? <StairFields view={view} actions={actions} bay={bay} /> : null}
      <div className="grid grid-cols-3 gap-3">
        <NumberBox
          label="Spacers"
          value={bay.spacers}
          bounds={[0, 50]}
          whole
          disabled={!canEdit}
          onChange={(spacers) => set({ spacers })}
        />
        <NumberBox
          label={`Skew at ${bay.from}, °`}
          value={bay.skewFrom}
          bounds={[-89, 89]}
          disabled={!canEdit}
          onChange={(skewFrom) => set({ skewFrom })}
        />
        <NumberBox
          label={`Skew at ${bay.to}, °`}
          value={bay.skewTo}
          bounds={[-89, 89]}
          disabled={!canEdit}
          onChange={(skewTo) => set({ skewTo })}
        />
      </div>
      <PanelFindings view={view} of={{ kind: 'bay', id: bay.id }} />
      {canEdit && (
        <Button look="danger" onClick={remove}>
          Remove bay
        </Button>
      )}
    </section>
  )
}
