import type { GuardRules } from '@shared/schemas/guard-rules'
import { TextField } from '@/components/field'
import { Card } from '@/components/page'
import { allowed, refusalAt } from '@/lib/refusal'

interface NameFieldsProps {
  rules: GuardRules
  /** The id stays once surveys may name it. */
  isKnown: boolean
  error: unknown
  onChange: (fields: Partial<GuardRules>) => void
}

/** What own rules are called, by people and by surveys. */
export const NameFields = ({ rules, isKnown, error, onChange }: NameFieldsProps) => (
  <Card title="Name">
    <div className="grid gap-4 md:grid-cols-2">
      <TextField
        label="Name"
        required
        maxLength={120}
        value={rules.name}
        error={refusalAt(error, 'name', allowed.name)}
        onChange={(event) => onChange({ name: event.target.value })}
      />
      <TextField
        label="Edition"
        hint="A year, a by-law, a date."
        required
        maxLength={60}
        value={rules.edition}
        error={refusalAt(error, 'edition', 'Write an edition of up to 60 characters.')}
        onChange={(event) => onChange({ edition: event.target.value })}
      />
      <TextField
        label="Id"
        hint={isKnown ? 'Surveys name it so; it stays.' : 'Short, for surveys and files; it stays.'}
        required
        readOnly={isKnown}
        autoCapitalize="none"
        maxLength={40}
        value={rules.id}
        error={refusalAt(error, 'id', allowed.id)}
        onChange={(event) => onChange({ id: event.target.value })}
      />
    </div>
  </Card>
)
