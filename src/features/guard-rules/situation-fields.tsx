import type { GuardRules, Situation } from '@shared/schemas/guard-rules'
import type { LengthFormat } from '@shared/units/format-length'
import { inches } from '@shared/units/length'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { LengthField } from '@/components/length-field'
import { allowed, refusalAt } from '@/lib/refusal'
import { FigureField } from './figure-field'

interface SituationFieldsProps {
  situations: GuardRules['situations']
  format: LengthFormat
  error: unknown
  onChange: (situations: Situation[]) => void
}

/** Required heights, one for each situation the rules tell apart. */
export function SituationFields({ situations, format, error, onChange }: SituationFieldsProps) {
  const change = (place: number, fields: Partial<Situation>) =>
    onChange(situations.map((known, i) => (i === place ? { ...known, ...fields } : known)))
  return (
    <fieldset className="flex min-w-0 flex-col gap-4">
      <legend className="mb-2 text-lg font-semibold">Heights</legend>
      {situations.map((situation, i) => (
        <div key={situation.id} className="flex flex-col gap-2 border-b border-rule pb-3">
          <TextField
            label="Situation"
            required
            maxLength={160}
            value={situation.name}
            error={refusalAt(error, `situations.${i}.name`, 'Write a name of up to 160 characters.')}
            onChange={(event) => change(i, { name: event.target.value })}
          />
          <FigureField
            label="Height at least"
            path={`situations.${i}.height`}
            figure={situation.height}
            format={format}
            required
            error={error}
            onChange={(height) => height && change(i, { height })}
          />
          <LengthField
            label="Holds up to a fall of"
            hint="Left empty, at any fall."
            value={situation.upToFall}
            format={format}
            error={refusalAt(error, `situations.${i}.upToFall`, allowed.above)}
            onChange={(upToFall) => upToFall !== situation.upToFall && change(i, { upToFall })}
          />
          {situations.length > 1 ? (
            <Button look="quiet" className="self-start" onClick={() => onChange(situations.toSpliced(i, 1))}>
              Remove {situation.name}
            </Button>
          ) : null}
        </div>
      ))}
      {situations.length < MOST ? (
        <Button className="self-start" onClick={() => onChange([...situations, another(situations)])}>
          Add a situation
        </Button>
      ) : null}
    </fieldset>
  )
}

/** As many as one set of rules may hold. */
const MOST = 12

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
