import { TextField } from '@/components/field'
import { allowed, refusalAt } from '@/lib/refusal'

interface NameFieldsProps {
  value: { id: string; name: string }
  /** The id stays once surveys may name it. */
  isKnown: boolean
  error: unknown
  onChange: (fields: { id?: string; name?: string }) => void
}

/** What a fitting or cable is called: by files, and by people. */
export const NameFields = ({ value, isKnown, error, onChange }: NameFieldsProps) => (
  <div className="grid gap-4 md:grid-cols-[1fr_2fr]">
    <TextField
      label="Id"
      hint={isKnown ? 'Surveys and files name it so; it stays.' : 'Short, for surveys and files; it stays.'}
      required
      readOnly={isKnown}
      autoCapitalize="none"
      autoComplete="off"
      maxLength={40}
      value={value.id}
      error={refusalAt(error, 'id', allowed.id)}
      onChange={(event) => onChange({ id: event.target.value })}
    />
    <TextField
      label="Name"
      hint="What people read on lists and tags."
      required
      autoComplete="off"
      maxLength={120}
      value={value.name}
      error={refusalAt(error, 'name', allowed.name)}
      onChange={(event) => onChange({ name: event.target.value })}
    />
  </div>
)
