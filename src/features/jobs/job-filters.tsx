import type { Person } from '@shared/schemas/person'
import { stages } from '@shared/schemas/job'
import { SelectField, TextField } from '@/components/field'
import type { JobView } from './job-address'

interface JobFiltersProps {
  view: JobView
  people: readonly Person[]
  onChange: (name: keyof JobView, value: string) => void
}

export function JobFilters({ view, people, onChange }: JobFiltersProps) {
  return (
    <div
      role="search"
      aria-label="Jobs"
      className="mb-4 grid grid-cols-3 gap-x-2 gap-y-3 md:grid-cols-[2fr_1fr_1fr_1fr]"
    >
      <TextField
        className="col-span-3 md:col-span-1"
        label="Search number, title, customer, site"
        type="search"
        value={view.search}
        maxLength={120}
        onChange={(event) => onChange('search', event.target.value)}
      />
      <SelectField
        label="Stage"
        value={view.stage}
        onChange={(event) => onChange('stage', event.target.value)}
      >
        <option value="">all</option>
        {stages.map((stage) => (
          <option key={stage}>{stage}</option>
        ))}
      </SelectField>
      <SelectField label="With" value={view.with} onChange={(event) => onChange('with', event.target.value)}>
        <option value="">anybody</option>
        {people.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <SelectField
        label="Sort by"
        value={view.sort}
        onChange={(event) => onChange('sort', event.target.value)}
      >
        <option value="updated">change</option>
        <option value="due">due date</option>
        <option value="number">number</option>
      </SelectField>
    </div>
  )
}
