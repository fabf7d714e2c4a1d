import { useState } from 'react'
import { STARTING_SETTLING_STRETCH } from '@shared/calculation/cable-properties'
import { type Cable, constructions } from '@shared/schemas/hardware'
import type { Units } from '@shared/schemas/quantities'
import type { LengthFormat } from '@shared/units/format-length'
import { inches } from '@shared/units/length'
import { ChoiceGroup } from '@/components/choices'
import { LengthField } from '@/components/length-field'
import { NumberField } from '@/components/number-field'
import { useAskBeforeLeaving } from '@/components/use-ask-before-leaving'
import { useSaveCable } from './api/save-cable'
import { cableWords } from './cable-words'
import { ForceField } from '@/components/force-field'
import { NameFields } from './name-fields'
import { offeredStiffness } from './offered-stiffness'
import { PriceField } from './price-field'
import { allowed, refusalAt } from '@/lib/refusal'
import { SafeForm } from '@/components/safe-form'
import { StiffnessNote } from './stiffness-note'

interface CableFormProps {
  /** The one to change; none adds one. */
  known?: { key: string; cable: Cable }
  units: Units
  format: LengthFormat
  onSaved: () => void
}

const start = { construction: '7x7', diameter: inches(5 / 32) } as const
const blank = (unit: Units['force']): Cable => ({
  ...start,
  id: '',
  name: '',
  axialStiffness: offeredStiffness(start, unit),
  settlingStretch: STARTING_SETTLING_STRETCH,
})

export function CableForm({ known, units, format, onSaved }: CableFormProps) {
  const [begun] = useState<Cable>(known?.cable ?? blank(units.force))
  const [cable, setCable] = useState(begun)
  const goOn = useAskBeforeLeaving(cable !== begun)
  const { mutate, error, isPending } = useSaveCable(known?.key)
  const set = (fields: Partial<Cable>) => setCable((now) => ({ ...now, ...fields }))
  return (
    <SafeForm
      saveLabel={known ? 'Save the cable' : 'Add the cable'}
      busy={isPending}
      error={error}
      onSave={() =>
        mutate(cable, {
          onSuccess: () => {
            goOn()
            onSaved()
          },
        })
      }
    >
      <NameFields value={cable} isKnown={known !== undefined} error={error} onChange={set} />
      <ChoiceGroup
        {...cableWords.construction}
        choices={constructions.map((value) => ({ value, label: value }))}
        value={cable.construction}
        onChange={(construction) => set({ construction })}
      />
      <LengthField
        {...cableWords.diameter}
        required
        value={cable.diameter}
        format={format}
        error={refusalAt(error, 'diameter', allowed.above)}
        onChange={(diameter) => diameter !== undefined && set({ diameter })}
      />
      <StiffnessNote
        cable={cable}
        unit={units.force}
        onUse={(stiffness) => set({ axialStiffness: stiffness })}
      />
      <div className="grid gap-4 md:grid-cols-2">
        <ForceField
          {...cableWords.axialStiffness}
          unit={units.force}
          value={cable.axialStiffness}
          error={refusalAt(error, 'axialStiffness', allowed.force)}
          onChange={(value) => value !== undefined && set({ axialStiffness: value })}
        />
        <NumberField
          {...cableWords.settlingStretch}
          unit="%"
          min={0}
          max={5}
          value={Number((cable.settlingStretch * 100).toFixed(6))}
          error={refusalAt(error, 'settlingStretch', 'Write a share from 0 to 5 %.')}
          onChange={(value) => value !== undefined && set({ settlingStretch: value / 100 })}
        />
        <ForceField
          {...cableWords.breakingLoad}
          unit={units.force}
          value={cable.breakingLoad}
          error={refusalAt(error, 'breakingLoad', allowed.force)}
          onChange={(value) => set({ breakingLoad: value })}
        />
        <PriceField
          {...cableWords.price}
          value={cable.price}
          error={error}
          onChange={(price) => set({ price })}
        />
      </div>
    </SafeForm>
  )
}
