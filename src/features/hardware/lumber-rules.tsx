import type { HouseRules } from '@shared/schemas/house-rules'
import type { Lumber } from '@shared/schemas/lumber'
import { psi } from '@shared/units/stress'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { NumberField } from '@/components/number-field'
import { Card } from '@/components/page'
import { FactList } from '@/components/fact-list'
import { refusalAt } from '@/lib/refusal'
import { shownStress, StressField } from './stress-field'
import type { HouseUnits } from './rule-values'

interface LumberRulesProps {
  lumber: HouseRules['lumber']
  units: HouseUnits
  error: unknown
  onChange: (lumber: Lumber[]) => void
}

const stressUnit = ({ format }: HouseUnits) => (format.style === 'millimetres' ? 'N/mm²' : 'psi')

const explanation =
  'Reference bending value Fb, size factor C_F and modulus E of posts, to start from (NDS Supplement, read in a copy). The first one stands for a post that names none. Grade stamp, all other factors and the engineer decide.'

/** Species and grades of posts, to change. */
export function LumberRules({ lumber, units, error, onChange }: LumberRulesProps) {
  const change = (place: number, fields: Partial<Lumber>) =>
    onChange(lumber.map((known, i) => (i === place ? { ...known, ...fields } : known)))
  return (
    <Card title="Lumber">
      <p className="mb-3 text-soft">{explanation}</p>
      <ul className="flex flex-col gap-4">
        {lumber.map((entry, i) => (
          <li key={entry.id} className="border-t border-rule pt-3">
            <LumberEntry
              entry={entry}
              unit={stressUnit(units)}
              faultAt={(key) => refusalAt(error, `lumber.${i}.${key}`, 'Write a number above zero.')}
              onChange={(fields) => change(i, fields)}
            />
            {lumber.length > 1 ? (
              <Button look="quiet" onClick={() => onChange(lumber.toSpliced(i, 1))}>
                Remove {entry.name}
              </Button>
            ) : null}
          </li>
        ))}
      </ul>
      <Button className="mt-3" onClick={() => onChange([...lumber, newLumber(lumber)])}>
        Add species and grade
      </Button>
    </Card>
  )
}

interface LumberEntryProps {
  entry: Lumber
  unit: 'psi' | 'N/mm²'
  faultAt: (key: keyof Lumber) => string | undefined
  onChange: (fields: Partial<Lumber>) => void
}

const LumberEntry = ({ entry, unit, faultAt, onChange }: LumberEntryProps) => (
  <div className="grid grid-cols-2 gap-3 md:grid-cols-4">
    <TextField
      label="Species and grade"
      value={entry.name}
      maxLength={120}
      error={faultAt('name')}
      onChange={(event) => onChange({ name: event.target.value })}
    />
    <StressField
      label="Fb"
      unit={unit}
      value={entry.bending}
      error={faultAt('bending')}
      onChange={(bending) => onChange({ bending })}
    />
    <NumberField
      label="C_F"
      min={0.01}
      max={5}
      value={entry.sizeFactor}
      error={faultAt('sizeFactor')}
      onChange={(sizeFactor) => sizeFactor !== undefined && onChange({ sizeFactor })}
    />
    <StressField
      label="E"
      unit={unit}
      value={entry.modulus}
      error={faultAt('modulus')}
      onChange={(modulus) => onChange({ modulus })}
    />
  </div>
)

/** Posts may name a lumber by its id, so that it is never used twice. */
function newLumber(known: readonly Lumber[]): Lumber {
  let number = known.length + 1
  while (known.some(({ id }) => id === `lumber-${number}`)) number += 1
  const id = `lumber-${number}`
  return { id, name: 'Another species', bending: psi(800), sizeFactor: 1, modulus: psi(1.2e6) }
}

/** The same for those who may not change them. */
export function LumberFacts({ lumber, units }: Pick<LumberRulesProps, 'lumber' | 'units'>) {
  const unit = stressUnit(units)
  return (
    <Card title="Lumber">
      <FactList
        facts={lumber.map(({ name, bending, sizeFactor, modulus }) => ({
          label: name,
          value: `Fb ${shownStress(bending, unit)} ${unit}, C_F ${sizeFactor}, E ${shownStress(modulus, unit)} ${unit}`,
          meaning: '',
        }))}
      />
      <p className="mt-3 text-sm text-soft">{explanation}</p>
    </Card>
  )
}
