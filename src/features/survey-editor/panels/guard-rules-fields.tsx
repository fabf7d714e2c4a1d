import { useState } from 'react'
import { guardFigures } from '@shared/calculation/checks/guard-figures'
import type { Guard } from '@shared/schemas/guard'
import { writeLength } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { SelectField } from '@/components/field'
import { sayDone } from '@/components/toast'
import { formatOfRules } from '@/lib/rules-format'
import { askedHeights } from './asked-heights'
import { AskedHeightsText, FollowingFigures } from './following-figures'
import { formatOf } from './format-of'
import { MeasureField } from './measure-field'
import { RulesSelect } from './rules-select'
import type { PanelProps } from './selection-panel'

const ties = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
  { value: '', label: 'Not said' },
] as const
type Ties = (typeof ties)[number]['value']

/** The guard rules a survey follows, and what they need to know of the guard. */
export function GuardRulesFields({ view, actions }: PanelProps) {
  const { survey, guardRules, canEdit } = view
  const { guard } = survey
  const [justChosen, setJustChosen] = useState(false)
  const figures = guardFigures(guard, guardRules)
  const set = (fields: Partial<Guard>) => {
    const given = Object.entries(fields)
    actions.perform({
      type: 'guard.set',
      set: Object.fromEntries(given.filter(([, value]) => value !== undefined)),
      unset: given.flatMap(([key, value]) => (value === undefined ? [key as keyof Guard] : [])),
    })
  }
  const choose = (fields: Partial<Guard>) => {
    set(fields)
    setJustChosen(true)
  }
  const tie: Ties = guard.railTies === undefined ? '' : guard.railTies ? 'yes' : 'no'
  return (
    <section aria-label="Guard rules" className="flex flex-col gap-3">
      <h3 className="text-lg font-semibold">Guard rules</h3>
      <RulesSelect view={view} onChoose={choose} />
      {figures.rules && figures.rules.situations.length > 1 ? (
        <SelectField
          label="Situation"
          value={guard.situation ?? ''}
          disabled={!canEdit}
          onChange={(event) => choose({ situation: event.target.value || undefined })}
        >
          <option value="">Not said: the strictest</option>
          {figures.rules.situations.map(({ id, name, height }) => (
            <option key={id} value={id}>
              {name}: {writeLength(height.value, formatOfRules(figures.rules ?? view))}
            </option>
          ))}
        </SelectField>
      ) : null}
      <HeightOffer view={view} actions={actions} justChosen={justChosen} />
      <MeasureField
        label="Fall beside the walking surface"
        hint="Down to the floor or ground below; some rules depend on it."
        least="zero"
        value={guard.fall}
        format={formatOf(view)}
        disabled={!canEdit}
        onChange={(fall) => set({ fall })}
      />
      <ChoiceGroup
        label="The top rail ties the end posts"
        hint="Tied, a post is held at both ends; otherwise it stands as a cantilever."
        choices={ties}
        value={tie}
        disabled={!canEdit}
        onChange={(value) => set({ railTies: value === '' ? undefined : value === 'yes' })}
      />
      <FollowingFigures figures={figures} />
      <p className="text-sm font-medium">
        Confirm with the authority having jurisdiction. Local code and a licensed engineer decide.
      </p>
    </section>
  )
}

/** What the rules ask where the guard is lower, or differs from rules just chosen, and one gesture that follows them. */
function HeightOffer({ view, actions, justChosen }: PanelProps & { justChosen: boolean }) {
  const asked = askedHeights(view.survey, view.guardRules)
  const { rules } = guardFigures(view.survey.guard, view.guardRules)
  const change = asked?.change
  if (!asked || !rules || !change || !(justChosen || asked.tooLow)) return null
  const height = writeLength(asked.height.value, formatOfRules(rules))
  const stair = change.stair && asked.stair ? writeLength(asked.stair.value, formatOfRules(rules)) : undefined
  const use = () => {
    actions.perform({ type: 'guard.set', set: change, unset: [] })
    sayDone('The guard has the height the rules ask for.', actions.undo)
  }
  return (
    <div className="flex flex-col gap-2 rounded border border-rule bg-paper p-3" role="status">
      <AskedHeightsText asked={asked} format={formatOfRules(rules)} />
      {view.canEdit ? (
        <Button onClick={use}>
          {change.height === undefined
            ? `Make it ${stair ?? height} on stairs`
            : `Make the guard ${height} high${stair === undefined || stair === height ? '' : `, ${stair} on stairs`}`}
        </Button>
      ) : null}
    </div>
  )
}
