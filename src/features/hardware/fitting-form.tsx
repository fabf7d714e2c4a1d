import { useState } from 'react'
import type { Cable, Fitting } from '@shared/schemas/hardware'
import { materials, type Material } from '@shared/schemas/post'
import type { LengthFormat } from '@shared/units/format-length'
import { inches, type Length } from '@shared/units/length'
import { moneyFromMain, moneyToMain } from '@shared/units/money'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { LengthField } from '@/components/length-field'
import { ErrorNote } from '@/components/states'
import { fieldError, messageOf } from '@/lib/api-error'
import { useSaveFitting } from './api/save-fitting'
import { CheckList } from './check-list'
import { FittingDrawing } from './fitting-drawing'
import { NumberField } from './number-field'

interface FittingFormProps {
  /** The one to change; none adds one. */
  known?: { key: string; fitting: Fitting }
  cables: readonly Cable[]
  format: LengthFormat
  readOnly: boolean
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

/** What each length of a fitting is, in one sentence. */
const lengths: readonly {
  key: 'body' | 'headProjection' | 'cutPastFace' | 'takeUp'
  label: string
  hint: string
}[] = [
  {
    key: 'body',
    label: 'Body',
    hint: 'How far it reaches into the post; of those that suit, the shortest is taken.',
  },
  { key: 'headProjection', label: 'Head projection', hint: 'How far it stands proud of the post’s face.' },
  {
    key: 'cutPastFace',
    label: 'Cut past face',
    hint: 'From its outer face toward the post to where the bare cable ends, the screw at its start.',
  },
  { key: 'takeUp', label: 'Take-up', hint: 'How far it can pull the cable.' },
]
const optionalLengths: readonly { key: 'maxRun' | 'hole' | 'spotFace'; label: string; hint: string }[] = [
  {
    key: 'maxRun',
    label: 'Longest run',
    hint: 'Beyond it the fitting is not used; left empty there is no limit of its own.',
  },
  { key: 'hole', label: 'Hole', hint: 'The bit to drill with.' },
  { key: 'spotFace', label: 'Spot-face', hint: 'Diameter of the flat for its head, where it needs one.' },
]
const woods: readonly Material[] = ['softwood', 'hardwood', 'masonry', 'metal', 'veneered']
const named = (value: Material) => ({ value, label: value })

export function FittingForm({ known, cables, format, readOnly, onSaved }: FittingFormProps) {
  const [fitting, setFitting] = useState<Fitting>(
    known?.fitting ?? { ...blank, cables: cables.map(({ id }) => id) },
  )
  const save = useSaveFitting(known?.key)
  const set = (fields: Partial<Fitting>) => setFitting((now) => ({ ...now, ...fields }))
  const of = (path: string) => fieldError(save.error, path)
  const setGrip = (material: Material, grip: Length | undefined) => {
    const { [material]: _before, ...others } = fitting.minGrip
    set({ minGrip: grip === undefined ? others : { ...others, [material]: grip } })
  }
  return (
    <form
      onSubmit={(event) => {
        event.preventDefault()
        save.mutate(fitting, { onSuccess: onSaved })
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
            value={fitting.id}
            error={of('id')}
            onChange={(event) => set({ id: event.target.value })}
          />
          <TextField
            label="Name"
            required
            maxLength={120}
            value={fitting.name}
            error={of('name')}
            onChange={(event) => set({ name: event.target.value })}
          />
        </div>
        <ChoiceGroup
          label="Mount"
          choices={[
            { value: 'drilled', label: 'Drilled into the post' },
            { value: 'surface', label: 'Fixed on its face' },
          ]}
          value={fitting.mount}
          onChange={(mount) => set({ mount })}
        />
        <FittingDrawing fitting={fitting} format={format} />
        <div className="grid gap-4 md:grid-cols-2">
          {lengths.map(({ key, label, hint }) => (
            <LengthField
              key={key}
              label={label}
              hint={hint}
              required
              value={fitting[key]}
              format={format}
              error={of(key)}
              onChange={(value) => value !== undefined && set({ [key]: value })}
            />
          ))}
          {optionalLengths.map(({ key, label, hint }) => (
            <LengthField
              key={key}
              label={label}
              hint={hint}
              value={fitting[key]}
              format={format}
              error={of(key)}
              onChange={(value) => set({ [key]: value })}
            />
          ))}
          <NumberField
            label="Largest angle, °"
            hint="Between the cable and the square of the post’s face."
            value={fitting.maxAngle}
            error={of('maxAngle')}
            onChange={(value) => set({ maxAngle: value ?? 0 })}
          />
          <NumberField
            label="Price each"
            hint="Breaks ties between fittings of one body."
            value={fitting.price === undefined ? undefined : moneyToMain(fitting.price)}
            error={of('price')}
            onChange={(value) => set({ price: value === undefined ? undefined : moneyFromMain(value) })}
          />
        </div>
        <CheckList
          label="Post materials it suits"
          choices={materials.map(named)}
          value={fitting.materials}
          error={of('materials')}
          onChange={(given) => set({ materials: given })}
        />
        <CheckList
          label="Cables it takes"
          choices={cables.map(({ id, name }) => ({ value: id, label: name }))}
          value={fitting.cables}
          error={of('cables')}
          onChange={(given) => set({ cables: given })}
        />
        {fitting.mount === 'drilled' ? (
          <fieldset>
            <legend className="text-sm font-medium text-soft">
              Least grip in the core, by its material; a core left empty is not suited
            </legend>
            <div className="mt-2 grid grid-cols-2 gap-4 md:grid-cols-4">
              {woods.slice(0, 4).map((material) => (
                <LengthField
                  key={material}
                  label={material}
                  value={fitting.minGrip[material]}
                  format={format}
                  error={of(`minGrip.${material}`)}
                  onChange={(grip) => setGrip(material, grip)}
                />
              ))}
            </div>
          </fieldset>
        ) : null}
        <CheckList
          label="Tap the hole in"
          choices={[
            { value: 'softwood', label: 'softwood' },
            { value: 'hardwood', label: 'hardwood' },
          ]}
          value={fitting.tap.filter((core) => core === 'softwood' || core === 'hardwood')}
          onChange={(tap) => set({ tap })}
        />
        {readOnly ? null : (
          <Button type="submit" look="primary" busy={save.isPending}>
            {known ? 'Save the fitting' : 'Add the fitting'}
          </Button>
        )}
      </fieldset>
    </form>
  )
}
