import { useState } from 'react'
import { axialStiffness, metallicArea, startingModulus } from '@shared/calculation/cable-properties'
import { type Cable, constructions } from '@shared/schemas/hardware'
import type { Units } from '@shared/schemas/quantities'
import { newtons } from '@shared/units/force'
import { writeForce } from '@shared/units/format-force'
import type { LengthFormat } from '@shared/units/format-length'
import { inches } from '@shared/units/length'
import { moneyFromMain, moneyToMain } from '@shared/units/money'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { LengthField } from '@/components/length-field'
import { ErrorNote } from '@/components/states'
import { fieldError, messageOf } from '@/lib/api-error'
import { useSaveCable } from './api/save-cable'
import { ForceField } from './force-field'
import { NumberField } from './number-field'

interface CableFormProps {
  known?: { key: string; cable: Cable }
  units: Units
  format: LengthFormat
  readOnly: boolean
  onSaved: () => void
}

const start = { construction: '7x7', diameter: inches(5 / 32) } as const
const blank: Cable = {
  ...start,
  id: '',
  name: '',
  axialStiffness: newtons(axialStiffness(start)),
  settlingStretch: 0.00125,
}

export function CableForm({ known, units, format, readOnly, onSaved }: CableFormProps) {
  const [cable, setCable] = useState<Cable>(known?.cable ?? blank)
  const save = useSaveCable(known?.key)
  const set = (fields: Partial<Cable>) => setCable((now) => ({ ...now, ...fields }))
  const of = (path: string) => fieldError(save.error, path)
  const derived = newtons(axialStiffness(cable))
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault()
        save.mutate(cable, { onSuccess: onSaved })
      }}
    >
      <fieldset disabled={readOnly} className="flex flex-col gap-5">
        {save.error ? <ErrorNote message={messageOf(save.error)} /> : null}
        <div className="grid gap-4 md:grid-cols-[1fr_2fr]">
          <TextField
            label="Id"
            hint="Short, used in files; it stays"
            required
            readOnly={known !== undefined}
            maxLength={40}
            value={cable.id}
            error={of('id')}
            onChange={(event) => set({ id: event.target.value })}
          />
          <TextField
            label="Name"
            required
            maxLength={120}
            value={cable.name}
            error={of('name')}
            onChange={(event) => set({ name: event.target.value })}
          />
        </div>
        <ChoiceGroup
          label="Construction"
          choices={constructions.map((value) => ({ value, label: value }))}
          value={cable.construction}
          onChange={(construction) => set({ construction })}
        />
        <LengthField
          label="Diameter"
          required
          value={cable.diameter}
          format={format}
          error={of('diameter')}
          onChange={(diameter) => diameter !== undefined && set({ diameter })}
        />
        <div className="rounded border border-rule bg-paper p-3">
          <p>
            Metallic area{' '}
            <span className="figures font-medium text-spruce">{metallicArea(cable).toFixed(3)} mm²</span>,
            axial stiffness{' '}
            <span className="figures font-medium text-spruce">{writeForce(derived, units.force)}</span> at a
            modulus of {startingModulus[cable.construction] / 1000} kN/mm².
          </p>
          <p className="mt-1 text-sm text-soft">
            Equal round wires; the modulus is remembered from EN 1993-1-11, table 3.1. The maker’s certificate
            decides.
          </p>
          {readOnly ? null : (
            <Button className="mt-2" onClick={() => set({ axialStiffness: derived })}>
              Use {writeForce(derived, units.force)}
            </Button>
          )}
        </div>
        <div className="grid gap-4 md:grid-cols-2">
          <ForceField
            label="Axial stiffness"
            hint="How hard it is to stretch: area times modulus."
            unit={units.force}
            value={cable.axialStiffness}
            error={of('axialStiffness')}
            onChange={(value) => value !== undefined && value > 0 && set({ axialStiffness: value })}
          />
          <NumberField
            label="Settling stretch, %"
            hint="What a new cable gives as its strands settle; 0.125 % for a lightly loaded one (rope handbooks)."
            value={Number((cable.settlingStretch * 100).toFixed(6))}
            error={of('settlingStretch')}
            onChange={(value) => set({ settlingStretch: (value ?? 0) / 100 })}
          />
          <ForceField
            label="Breaking load"
            hint="From the maker’s certificate."
            unit={units.force}
            value={cable.breakingLoad}
            error={of('breakingLoad')}
            onChange={(value) => set({ breakingLoad: value })}
          />
          <NumberField
            label="Price"
            value={cable.price === undefined ? undefined : moneyToMain(cable.price)}
            error={of('price')}
            onChange={(value) => set({ price: value === undefined ? undefined : moneyFromMain(value) })}
          />
        </div>
        {readOnly ? null : (
          <Button type="submit" look="primary" busy={save.isPending}>
            {known ? 'Save the cable' : 'Add the cable'}
          </Button>
        )}
      </fieldset>
    </form>
  )
}
