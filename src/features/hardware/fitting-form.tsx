import { useState } from 'react'
import type { Fitting } from '@shared/schemas/hardware'
import type { Units } from '@shared/schemas/quantities'
import type { LengthFormat } from '@shared/units/format-length'
import { inches } from '@shared/units/length'
import { ChoiceGroup } from '@/components/choices'
import { ForceField } from '@/components/force-field'
import { LengthField } from '@/components/length-field'
import { NumberField } from '@/components/number-field'
import { useAskBeforeLeaving } from '@/components/use-ask-before-leaving'
import { useSaveFitting } from './api/save-fitting'
import { FittingDrawing } from './fitting-drawing'
import { type CableChoice, FittingUses } from './fitting-uses'
import { angleWords, fittingExtras, fittingLengths, priceWords, ratingWords } from './fitting-words'
import { NameFields } from './name-fields'
import { PriceField } from './price-field'
import { allowed as allowedIn, refusalAt } from '@/lib/refusal'
import { SafeForm } from '@/components/safe-form'
import { mountWords } from './words'

interface FittingFormProps {
  /** The one to change; none adds one. */
  known?: { key: string; fitting: Fitting }
  cables: readonly CableChoice[]
  format: LengthFormat
  force: Units['force']
  onSaved: () => void
}

const blank: Fitting = {
  id: '',
  name: '',
  mount: 'drilled',
  materials: ['softwood'],
  cables: [],
  body: inches(2),
  headProjection: inches(0.25),
  cutPastFace: inches(1),
  takeUp: inches(0.75),
  maxAngle: 5,
  minGrip: {},
  tap: [],
}
const mounts = (['drilled', 'surface'] as const).map((value) => ({ value, label: mountWords[value].long }))

export function FittingForm({ known, cables, format, force, onSaved }: FittingFormProps) {
  const [start] = useState<Fitting>(known?.fitting ?? { ...blank, cables: cables.map(({ id }) => id) })
  const [fitting, setFitting] = useState(start)
  const goOn = useAskBeforeLeaving(fitting !== start)
  const { mutate, error, isPending } = useSaveFitting(known?.key)
  const set = (fields: Partial<Fitting>) => setFitting((now) => ({ ...now, ...fields }))
  return (
    <SafeForm
      saveLabel={known ? 'Save the fitting' : 'Add the fitting'}
      busy={isPending}
      error={error}
      onSave={() =>
        mutate(fitting, {
          onSuccess: () => {
            goOn()
            onSaved()
          },
        })
      }
    >
      <NameFields value={fitting} isKnown={known !== undefined} error={error} onChange={set} />
      <ChoiceGroup
        label="Mount"
        hint="A drilled one goes into a hole in the post; one on the face only needs its screws or bolts there."
        choices={mounts}
        value={fitting.mount}
        onChange={(mount) => set({ mount })}
      />
      <FittingDrawing fitting={fitting} format={format} />
      <div className="grid gap-4 md:grid-cols-2">
        {fittingLengths.map(({ key, label, hint, allowed }) => (
          <LengthField
            key={key}
            label={label}
            hint={hint}
            required
            value={fitting[key]}
            format={format}
            error={refusalAt(error, key, allowed)}
            onChange={(value) => value !== undefined && set({ [key]: value })}
          />
        ))}
        {fittingExtras.map(({ key, label, hint, allowed }) => (
          <LengthField
            key={key}
            label={label}
            hint={hint}
            value={fitting[key]}
            format={format}
            error={refusalAt(error, key, allowed)}
            onChange={(value) => set({ [key]: value })}
          />
        ))}
        <NumberField
          {...angleWords}
          unit="°"
          min={0}
          max={90}
          value={fitting.maxAngle}
          error={refusalAt(error, 'maxAngle', 'Write an angle from 0° to 90°.')}
          onChange={(value) => set({ maxAngle: value ?? 0 })}
        />
        <ForceField
          {...ratingWords}
          unit={force}
          value={fitting.rating}
          error={refusalAt(error, 'rating', allowedIn.force)}
          onChange={(rating) => set({ rating })}
        />
        <PriceField
          {...priceWords}
          value={fitting.price}
          error={error}
          onChange={(price) => set({ price })}
        />
      </div>
      <FittingUses fitting={fitting} cables={cables} format={format} error={error} onChange={set} />
    </SafeForm>
  )
}
