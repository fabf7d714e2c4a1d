import type { Person } from '@shared/schemas/person'
import { stages } from '@shared/schemas/job'
import { SelectField, TextField } from '@/components/field'

interface JobFiltersProps {
  values: { search: string; stage: string; personId: string; sort: string }
  people: readonly Person[]
  onChange: (name: 'search' | 'stage' | 'personId' | 'sort', value: string) => void
}

export function JobFilters({ values, people, onChange }: JobFiltersProps) {
  return (
    <div role="search" className="mb-4 grid grid-cols-2 gap-3 md:grid-cols-[2fr_1fr_1fr_1fr]">
      <TextField
        className="col-span-2 md:col-span-1"
        label="Search number, title, customer, site"
        type="search"
        value={values.search}
        maxLength={120}
        onChange={(event) => onChange('search', event.target.value)}
      />
      <SelectField
        label="Stage"
        value={values.stage}
        onChange={(event) => onChange('stage', event.target.value)}
      >
        <option value="">all</option>
        {stages.map((stage) => (
          <option key={stage}>{stage}</option>
        ))}
      </SelectField>
      <SelectField
        label="With"
        value={values.personId}
        onChange={(event) => onChange('personId', event.target.value)}
      >
        <option value="">anybody</option>
        {people.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </SelectField>
      <SelectField
        className="col-span-2 md:col-span-1"
        label="Sort by"
        value={values.sort}
        onChange={(event) => onChange('sort', event.target.value)}
      >
        <option value="updated">last change</option>
        <option value="due">due date</option>
        <option value="number">number</option>
      </SelectField>
    </div>
  )
}
