import { type FormEvent, useState } from 'react'
import type { Company } from '@shared/schemas/company'
import { Button } from '@/components/button'
import { Checkbox, ChoiceGroup } from '@/components/choices'
import { TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { sayDone } from '@/components/toast'
import { useFirstFault } from '@/components/use-first-fault'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { useChangeCompany } from './api/change-company'

const units = [
  { value: 'in', label: 'Inches, pounds-force' },
  { value: 'mm', label: 'Millimetres, newtons' },
] as const
const fractions = [
  { value: '16', label: '1/16 in' },
  { value: '32', label: '1/32 in' },
  { value: '64', label: '1/64 in' },
] as const

/** The form of what holds for the whole company. */
export function CompanyForm({ company }: { company: Company }) {
  const change = useChangeCompany()
  const form = useFirstFault(change.error)
  const [length, setLength] = useState(company.units.length)
  const [fraction, setFraction] = useState(company.fraction)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    const fields = new FormData(event.currentTarget)
    const name = fields.get('name')
    change.mutate(
      {
        name: typeof name === 'string' ? name : '',
        units: { length, force: length === 'in' ? 'lbf' : 'N' },
        fraction,
        keepPhotoPlace: fields.get('keepPhotoPlace') === 'on',
      },
      { onSuccess: () => sayDone('Saved.') },
    )
  }
  const message = formMessage(change.error, ['name'])
  return (
    <form ref={form} onSubmit={submit} className="flex flex-col gap-5">
      <TextField
        label="Name"
        name="name"
        autoComplete="organization"
        required
        maxLength={120}
        defaultValue={company.name}
        error={fieldError(change.error, 'name')}
      />
      <ChoiceGroup
        label="New surveys are measured in"
        choices={units}
        value={length}
        onChange={setLength}
        hint="Surveys that are begun keep their units."
      />
      {length === 'in' ? (
        <ChoiceGroup
          label="Finest fraction shown and keyed in"
          choices={fractions}
          value={`${fraction}`}
          onChange={(value) => setFraction(value === '64' ? 64 : value === '32' ? 32 : 16)}
        />
      ) : null}
      <Checkbox
        name="keepPhotoPlace"
        label="Keep where photos were taken"
        hint="Off: the place is dropped from every photo before it is stored."
        defaultChecked={company.keepPhotoPlace}
      />
      {message ? <ErrorNote message={message} /> : null}
      <Button type="submit" look="primary" busy={change.isPending} className="sm:self-start">
        Save
      </Button>
    </form>
  )
}
