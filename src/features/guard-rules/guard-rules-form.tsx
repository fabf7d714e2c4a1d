import { useState } from 'react'
import type { GuardRules } from '@shared/schemas/guard-rules'
import type { LengthFormat } from '@shared/units/format-length'
import { inches } from '@shared/units/length'
import { poundsForce } from '@shared/units/force'
import { TextField } from '@/components/field'
import { ForceField } from '@/components/force-field'
import { LengthField } from '@/components/length-field'
import { Card } from '@/components/page'
import { SafeForm } from '@/components/safe-form'
import { allowed, refusalAt } from '@/lib/refusal'
import { useSaveGuardRules } from './api/save-guard-rules'
import { FigureField, SectionField } from './figure-field'
import { type LengthFigure, lengthFigures } from './figure-lines'
import { asOwn } from './own-copy'
import { SituationFields } from './situation-fields'

interface GuardRulesFormProps {
  /** Of own rules that are there already. */
  known?: string
  start: GuardRules
  onSaved: (rules: GuardRules) => void
}

/** Own guard rules, to write or change, in the rules' own units. */
export function GuardRulesForm({ known, start, onSaved }: GuardRulesFormProps) {
  const [rules, setRules] = useState(start)
  const { mutate, error, isPending } = useSaveGuardRules(known)
  const set = (fields: Partial<GuardRules>) => setRules((now) => ({ ...now, ...fields }))
  const format: LengthFormat =
    rules.units.length === 'mm' ? { style: 'millimetres' } : { style: 'inches', finest: 64 }
  return (
    <SafeForm
      saveLabel="Save the guard rules"
      busy={isPending}
      error={error}
      onSave={() => mutate(rules, { onSuccess: () => onSaved(rules) })}
    >
      <Card title="Name">
        <div className="grid gap-4 md:grid-cols-2">
          <TextField
            label="Name"
            required
            maxLength={120}
            value={rules.name}
            error={refusalAt(error, 'name', allowed.name)}
            onChange={(event) => set({ name: event.target.value })}
          />
          <TextField
            label="Edition"
            hint="A year, a by-law, a date."
            required
            maxLength={60}
            value={rules.edition}
            error={refusalAt(error, 'edition', 'Write an edition of up to 60 characters.')}
            onChange={(event) => set({ edition: event.target.value })}
          />
          <TextField
            label="Id"
            hint={known ? 'Surveys name it so; it stays.' : 'Short, for surveys and files; it stays.'}
            required
            readOnly={known !== undefined}
            autoCapitalize="none"
            maxLength={40}
            value={rules.id}
            error={refusalAt(error, 'id', allowed.id)}
            onChange={(event) => set({ id: event.target.value })}
          />
        </div>
      </Card>
      <Card>
        <SituationFields
          situations={rules.situations}
          format={format}
          onChange={(situations) => set({ situations })}
        />
      </Card>
      <Card title="Lengths">
        <div className="flex flex-col gap-3">
          {lengthFigures.map(([key, label]) => (
            <FigureField
              key={key}
              label={label}
              figure={rules[key]}
              format={format}
              required={key === 'sphere'}
              error={refusalAt(error, `${key}.value`, allowed.above)}
              onChange={(figure) =>
                set({ [key]: figure } satisfies Partial<Record<LengthFigure, typeof figure>>)
              }
            />
          ))}
        </div>
      </Card>
      <LoadFields rules={rules} format={format} error={error} onChange={set} />
      <ClimbFields rules={rules} format={format} onChange={set} />
    </SafeForm>
  )
}

interface PartProps {
  rules: GuardRules
  format: LengthFormat
  onChange: (fields: Partial<GuardRules>) => void
}

function LoadFields({ rules, format, error, onChange }: PartProps & { error: unknown }) {
  const { topLoad, infillLoad, units } = rules
  return (
    <Card title="Loads">
      <div className="flex flex-col gap-3">
        <div className="grid grid-cols-2 gap-3">
          <ForceField
            label="At any point of the top"
            unit={units.force}
            value={topLoad?.value}
            error={refusalAt(error, 'topLoad.value', allowed.force)}
            onChange={(value) => {
              if (value !== topLoad?.value)
                onChange({ topLoad: value === undefined ? undefined : asOwn(value, topLoad) })
            }}
          />
          <SectionField
            of="load at the top"
            source={topLoad}
            onChange={(section) => topLoad && onChange({ topLoad: { ...topLoad, section } })}
          />
        </div>
        <div className="grid grid-cols-2 gap-3">
          <ForceField
            label="On the infill"
            unit={units.force}
            value={infillLoad?.value}
            error={refusalAt(error, 'infillLoad.value', allowed.force)}
            onChange={(value) => {
              if (value === infillLoad?.value) return
              const side = infillLoad?.side ?? inches(12)
              onChange({
                infillLoad: value === undefined ? undefined : { side, ...asOwn(value, infillLoad) },
              })
            }}
          />
          <LengthField
            label="on a square of"
            value={infillLoad?.side}
            format={format}
            required
            disabled={!infillLoad}
            onChange={(side) =>
              infillLoad && side !== undefined && side !== infillLoad.side
                ? onChange({ infillLoad: { ...infillLoad, side, basis: 'own' } })
                : undefined
            }
          />
          <SectionField
            of="load on the infill"
            source={infillLoad}
            onChange={(section) => infillLoad && onChange({ infillLoad: { ...infillLoad, section } })}
          />
        </div>
        <p className="text-sm text-soft">Left empty, that load is not checked. {poundsText(units.force)}</p>
      </div>
    </Card>
  )
}

const poundsText = (unit: 'lbf' | 'N'): string =>
  unit === 'N' ? `50 lbf on 12 in is ${poundsForce(50).toFixed(0)} N on 304.8 mm.` : ''

function ClimbFields({ rules, format, onChange }: PartProps) {
  const { climbable } = rules
  const change = (fields: Partial<NonNullable<GuardRules['climbable']>>) => {
    const next = {
      from: inches(0),
      to: inches(36),
      section: 'own rule',
      ...climbable,
      ...fields,
      basis: 'own' as const,
    }
    onChange({ climbable: next })
  }
  return (
    <Card title="Nothing climbable">
      <div className="grid gap-3 md:grid-cols-3">
        <LengthField
          label="At a fall over"
          value={climbable?.fallOver}
          format={format}
          onChange={(fallOver) => fallOver !== climbable?.fallOver && change({ fallOver })}
        />
        <LengthField
          label="From"
          value={climbable?.from}
          format={format}
          required
          onChange={(from) => from !== undefined && from !== climbable?.from && change({ from })}
        />
        <LengthField
          label="To"
          hint="Emptied, climbing is not checked."
          value={climbable?.to}
          format={format}
          onChange={(to) => {
            if (to === undefined) onChange({ climbable: undefined })
            else if (to !== climbable?.to) change({ to })
          }}
        />
      </div>
    </Card>
  )
}
