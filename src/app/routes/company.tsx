import { type FormEvent, useState } from 'react'
import { Button } from '@/components/button'
import { Checkbox, ChoiceGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { Page } from '@/components/page'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { useSaveCompany } from '@/features/company/save-company'
import { useMay, useSession } from '@/features/session/session'
import { fieldError, messageOf } from '@/lib/api-error'

const units = [
  { value: 'in', label: 'Inches, pounds-force' },
  { value: 'mm', label: 'Millimetres, newtons' },
] as const
const fractions = [
  { value: '16', label: '1/16 in' },
  { value: '32', label: '1/32 in' },
  { value: '64', label: '1/64 in' },
] as const

export function Component() {
  const { company } = useSession()
  const mayEdit = useMay('company:edit')
  const save = useSaveCompany()
  const [length, setLength] = useState(company.units.length)
  const [fraction, setFraction] = useState(company.fraction)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const form = new FormData(event.currentTarget)
    const name = form.get('name')
    save.mutate(
      {
        name: typeof name === 'string' ? name : '',
        units: { length, force: length === 'in' ? 'lbf' : 'N' },
        fraction,
        keepPhotoPlace: form.get('keepPhotoPlace') === 'on',
      },
      { onSuccess: () => sayDone('Saved.') },
    )
  }
  return (
    <Page title="Company" width="narrow">
      <form onSubmit={submit}>
        <fieldset disabled={!mayEdit} className="flex flex-col gap-5">
          {mayEdit ? null : <p className="text-soft">An owner of your company changes these.</p>}
          {save.error ? <ErrorNote message={messageOf(save.error)} /> : null}
          <TextField
            label="Name"
            name="name"
            required
            maxLength={120}
            defaultValue={company.name}
            error={fieldError(save.error, 'name')}
          />
          <ChoiceGroup
            label="New surveys are measured in"
            choices={units}
            value={length}
            onChange={setLength}
          />
          <ChoiceGroup
            label="Finest fraction shown and keyed in"
            choices={fractions}
            value={`${fraction}`}
            onChange={(value) => setFraction(value === '64' ? 64 : value === '32' ? 32 : 16)}
          />
          <Checkbox
            name="keepPhotoPlace"
            label="Keep where photos were taken"
            hint="Off: the place is dropped from every photo before it is stored."
            defaultChecked={company.keepPhotoPlace}
          />
          {mayEdit ? (
            <Button type="submit" look="primary" busy={save.isPending}>
              Save
            </Button>
          ) : null}
        </fieldset>
      </form>
    </Page>
  )
}
