import type { FormEvent } from 'react'
import type { Job } from '@shared/schemas/job'
import type { Person } from '@shared/schemas/person'
import { Button } from '@/components/button'
import { SelectField, TextArea, TextField } from '@/components/field'
import { ErrorNote } from '@/components/states'
import { useFirstFault } from '@/components/use-first-fault'
import { fieldError } from '@/lib/api-error'
import { formMessage } from '@/lib/form-message'
import { type JobFields, useSaveJob } from './api/save-job'
import { peopleToChoose } from './people-to-choose'

interface JobFormProps {
  /** The job to change; none opens a new one. */
  job?: Job
  people: readonly Person[]
  onSaved: (job: Job) => void
}

const text = (form: FormData, name: string): string => {
  const value = form.get(name)
  return typeof value === 'string' ? value.trim() : ''
}

const fieldsOf = (form: FormData): JobFields => ({
  title: text(form, 'title'),
  customer: text(form, 'customer'),
  site: text(form, 'site'),
  due: text(form, 'due') || null,
  personId: text(form, 'personId') || null,
  notes: text(form, 'notes'),
})

export function JobForm({ job, people, onSaved }: JobFormProps) {
  const save = useSaveJob(job?.id, onSaved)
  const form = useFirstFault(save.error)
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault()
    save.mutate(fieldsOf(new FormData(event.currentTarget)))
  }
  const of = (path: string) => fieldError(save.error, path)
  const message = formMessage(save.error, ['title', 'customer', 'site', 'due', 'personId', 'notes'])
  return (
    <form ref={form} onSubmit={submit} className="flex flex-col gap-4">
      <TextField
        label="Title"
        name="title"
        required
        maxLength={120}
        defaultValue={job?.title}
        hint="Such as the customer’s name and the place"
        error={of('title')}
      />
      <TextField
        label="Customer"
        name="customer"
        maxLength={120}
        defaultValue={job?.customer}
        error={of('customer')}
      />
      <TextField label="Site" name="site" maxLength={300} defaultValue={job?.site} error={of('site')} />
      <TextField label="Due" name="due" type="date" defaultValue={job?.due ?? ''} error={of('due')} />
      <SelectField label="With" name="personId" defaultValue={job?.personId ?? ''} error={of('personId')}>
        <option value="">nobody yet</option>
        {peopleToChoose(people, job).map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <TextArea label="Notes" name="notes" maxLength={4000} defaultValue={job?.notes} error={of('notes')} />
      {message ? <ErrorNote message={message} /> : null}
      <Button type="submit" look="primary" busy={save.isPending}>
        {job ? 'Save' : 'Open the job'}
      </Button>
    </form>
  )
}
