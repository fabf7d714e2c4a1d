import type { Guard } from '@shared/schemas/guard'
import type { Survey } from '@shared/schemas/survey'
import type { Length } from '@shared/units/length'
import { ChoiceGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { formatOf } from './format-of'
import { GuardRulesFields } from './guard-rules-fields'
import { MeasureField } from './measure-field'
import type { PanelProps } from './selection-panel'

const units = [
  { value: 'in', label: 'Inches and pounds-force' },
  { value: 'mm', label: 'Millimetres and newtons' },
] as const

/** Heights that may lie on the walking surface itself. */
const fromZero: ReadonlySet<string> = new Set(['Opening begins at', 'Top readings at', 'Bottom readings at'])

/** The survey as a whole: its title, its units, and the guard it describes. */
export function SurveyPanel({ view, actions }: PanelProps) {
  const { survey, canEdit } = view
  const { guard } = survey
  const set = (set: Partial<Pick<Survey, 'title' | 'units'>>) =>
    actions.perform({ type: 'survey.set', set, unset: [] })
  const setGuard = (fields: Partial<Guard>) => actions.perform({ type: 'guard.set', set: fields, unset: [] })
  /** A guard's height that is always there. */
  const height = (label: string, value: Length, keep: (value: Length) => Partial<Guard>) => (
    <MeasureField
      label={label}
      least={fromZero.has(label) ? 'zero' : 'above-zero'}
      required
      value={value}
      format={formatOf(view)}
      disabled={!canEdit}
      onChange={(given) => {
        if (given !== undefined) setGuard(keep(given))
      }}
    />
  )
  /** Left empty, that of the guard rules. */
  const sphere = (key: 'sphere' | 'stairSphere', label: string) => (
    <MeasureField
      label={label}
      hint="left empty, that of the rules"
      value={guard[key]}
      format={formatOf(view)}
      disabled={!canEdit}
      onChange={(given) =>
        actions.perform({
          type: 'guard.set',
          set: given === undefined ? {} : { [key]: given },
          unset: given === undefined ? [key] : [],
        })
      }
    />
  )
  return (
    <div className="flex flex-col gap-5">
      <TextField
        key={survey.title}
        label="Title"
        defaultValue={survey.title}
        maxLength={120}
        disabled={!canEdit}
        onBlur={(event) => {
          const title = event.target.value.trim()
          if (title !== '' && title !== survey.title) set({ title })
        }}
      />
      <ChoiceGroup
        label="Units"
        choices={units}
        value={survey.units.length}
        disabled={!canEdit}
        onChange={(length) => set({ units: { length, force: length === 'in' ? 'lbf' : 'N' } })}
      />
      <GuardRulesFields view={view} actions={actions} />
      <fieldset className="grid grid-cols-2 gap-3" disabled={!canEdit}>
        <legend className="mb-2 text-lg font-semibold">Guard</legend>
        {height('Height', guard.height, (given) => ({ height: given }))}
        <MeasureField
          label="Top rail underside"
          value={guard.topRailUnderside}
          format={formatOf(view)}
          disabled={!canEdit}
          onChange={(topRailUnderside) =>
            actions.perform({
              type: 'guard.set',
              set: topRailUnderside === undefined ? {} : { topRailUnderside },
              unset: topRailUnderside === undefined ? ['topRailUnderside'] : [],
            })
          }
        />
        {height('Opening begins at', guard.bottom, (given) => ({ bottom: given }))}
        {sphere('sphere', 'No sphere of')}
        {sphere('stairSphere', 'On stairs no sphere of')}
        {height('Top readings at', guard.readAt.top, (top) => ({ readAt: { ...guard.readAt, top } }))}
        {height('Bottom readings at', guard.readAt.bottom, (bottom) => ({
          readAt: { ...guard.readAt, bottom },
        }))}
      </fieldset>
      <StairGuard view={view} actions={actions} />
    </div>
  )
}

/** Heights above the nosing line, for runs of stair bays only. */
function StairGuard({ view, actions }: PanelProps) {
  const { stair } = view.survey.guard
  const keep = (fields: Partial<NonNullable<Guard['stair']>>) => {
    const given = Object.entries({ ...stair, ...fields }).filter(([, value]) => value !== undefined)
    const isEmpty = given.length === 0
    actions.perform({
      type: 'guard.set',
      set: isEmpty ? {} : { stair: Object.fromEntries(given) },
      unset: isEmpty ? ['stair'] : [],
    })
  }
  const field = (key: 'height' | 'topRailUnderside' | 'bottom', label: string) => (
    <MeasureField
      label={label}
      least={key === 'bottom' ? 'zero' : 'above-zero'}
      value={stair?.[key]}
      format={formatOf(view)}
      disabled={!view.canEdit}
      onChange={(value) => keep({ [key]: value })}
    />
  )
  return (
    <fieldset className="grid grid-cols-2 gap-3" disabled={!view.canEdit}>
      <legend className="mb-1 text-lg font-semibold">On stairs</legend>
      <p className="col-span-2 text-sm text-soft">
        Heights above the nosing line; left empty, the guard’s own.
      </p>
      {field('height', 'Stair height')}
      {field('topRailUnderside', 'Stair rail underside')}
      {field('bottom', 'Stair opening begins at')}
    </fieldset>
  )
}
