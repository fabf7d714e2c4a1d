import { useState } from 'react'
import { inches, type Length } from '@shared/units/length'
import { Checkbox, CheckboxGroup, ChoiceGroup } from '@/components/choices'
import { SelectField, TextArea, TextField } from '@/components/field'
import { LengthField } from '@/components/length-field'
import { NumberField } from '@/components/number-field'
import { Card } from '@/components/page'

const materials = ['softwood', 'hardwood', 'veneered', 'masonry', 'metal'] as const

export function FieldParts() {
  const [material, setMaterial] = useState<(typeof materials)[number]>('veneered')
  const [length, setLength] = useState<Length | undefined>(inches(46.5))
  const [tension, setTension] = useState<number | undefined>(150)
  return (
    <Card title="Fields">
      <div className="grid gap-4 md:grid-cols-2">
        <TextField label="Title" hint="The customer’s name and the place." defaultValue="Back deck" />
        <TextField label="E-mail address" error="Write an address with an @." defaultValue="anna" />
        <LengthField
          label="Clear gap at the top"
          value={length}
          onChange={setLength}
          format={{ style: 'inches', finest: 16 }}
          hint={'Such as 46 1/2, 3\' 10 1/2" or 1181 mm.'}
        />
        <NumberField label="Tension" unit="lbf" value={tension} onChange={setTension} min={0} max={1000} />
        <SelectField label="Stage">
          <option>measure</option>
          <option>check</option>
        </SelectField>
        <TextField label="Number" value="J-104" readOnly />
        <TextArea label="Notes" className="md:col-span-2" />
        <ChoiceGroup
          label="Material"
          value={material}
          onChange={setMaterial}
          choices={materials.map((value) => ({ value, label: value }))}
        />
        <CheckboxGroup label="Roles" error="Choose one role or more.">
          <Checkbox label="surveyor" hint="Measures on site." />
          <Checkbox label="shop" hint="Cuts and crimps from the cut list." defaultChecked />
        </CheckboxGroup>
      </div>
    </Card>
  )
}
