import type { GuardRules, Situation } from '@shared/schemas/guard-rules'
import type { LengthFormat } from '@shared/units/format-length'
import { inches } from '@shared/units/length'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { FigureField } from './figure-field'

interface SituationFieldsProps {
  situations: GuardRules['situations']
  format: LengthFormat
  onChange: (situations: Situation[]) => void
}

/** Required heights, one for each situation the rules tell apart. */
export function SituationFields({ situations, format, onChange }: SituationFieldsProps) {
  const change = (place: number, fields: Partial<Situation>) =>
    onChange(situations.map((known, i) => (i === place ? { ...known, ...fields } : known)))
  return (
    <fieldset className="flex flex-col gap-4">
      <legend className="mb-2 text-lg font-semibold">Heights</legend>
      {situations.map((situation, i) => (
        <div key={situation.id} className="flex flex-col gap-2 border-b border-rule pb-3">
          <TextField
            label="Situation"
            required
            maxLength={160}
            value={situation.name}
            onChange={(event) => change(i, { name: event.target.value })}
          />
          <FigureField
            label="Height at least"
            figure={situation.height}
            format={format}
            required
            onChange={(height) => height && change(i, { height })}
          />
          {situations.length > 1 ? (
            <Button look="quiet" className="self-start" onClick={() => onChange(situations.toSpliced(i, 1))}>
              Remove {situation.name}
            </Button>
          ) : null}
        </div>
      ))}
      <Button className="self-start" onClick={() => onChange([...situations, another(situations)])}>
        Add a situation
      </Button>
    </fieldset>
  )
}

/** Surveys may name a situation by its id, so that it is never used twice. */
function another(known: readonly Situation[]): Situation {
  let number = known.length + 1
  while (known.some(({ id }) => id === `situation-${number}`)) number += 1
  return {
    id: `situation-${number}`,
    name: 'Another situation',
    height: { value: known[0]?.height.value ?? inches(36), section: 'own rule', basis: 'own' },
  }
}
