import type { Cable } from '@shared/schemas/hardware'
import type { Units } from '@shared/schemas/quantities'
import type { LengthFormat } from '@shared/units/format-length'
import { moneyToMain } from '@shared/units/money'
import { Length } from '@/components/length'
import { cableWords } from './cable-words'
import { type Fact, FactList } from '@/components/fact-list'
import { StiffnessNote } from './stiffness-note'
import { forceText } from './words'

interface CableFactsProps {
  cable: Cable
  units: Units
  format: LengthFormat
}

/** A cable for those who may not change it. */
export function CableFacts({ cable, units, format }: CableFactsProps) {
  const force = (value: number | undefined) =>
    value === undefined ? 'not set' : forceText(value, units.force)
  const fact = (key: keyof typeof cableWords, value: Fact['value']): Fact => ({
    label: cableWords[key].label,
    value,
    meaning: cableWords[key].hint,
  })
  return (
    <>
      <FactList
        facts={[
          { label: 'Id', value: cable.id },
          fact('construction', cable.construction),
          fact('diameter', <Length value={cable.diameter} format={format} />),
          fact('axialStiffness', force(cable.axialStiffness)),
          fact('settlingStretch', `${Number((cable.settlingStretch * 100).toFixed(6))} %`),
          fact('breakingLoad', force(cable.breakingLoad)),
          fact('price', cable.price === undefined ? 'not set' : moneyToMain(cable.price).toFixed(2)),
        ]}
      />
      <div className="mt-4">
        <StiffnessNote cable={cable} unit={units.force} onUse={null} />
      </div>
    </>
  )
}
