import type { Fitting } from '@shared/schemas/hardware'
import { materials } from '@shared/schemas/post'
import type { Units } from '@shared/schemas/quantities'
import type { LengthFormat } from '@shared/units/format-length'
import { moneyToMain } from '@shared/units/money'
import { Length } from '@/components/length'
import { type Fact, FactList } from '@/components/fact-list'
import { FittingDrawing } from './fitting-drawing'
import type { CableChoice } from './fitting-uses'
import {
  angleWords,
  fittingExtras,
  fittingLengths,
  priceWords,
  ratingWords,
  suitWords,
} from './fitting-words'
import { forceText, mountWords } from './words'

interface FittingFactsProps {
  fitting: Fitting
  cables: readonly CableChoice[]
  format: LengthFormat
  force: Units['force']
}

/** A fitting for those who may not change it. */
export function FittingFacts({ fitting, cables, format, force }: FittingFactsProps) {
  const length = (value: number | undefined) =>
    value === undefined ? 'not set' : <Length value={value} format={format} />
  const grips = materials.filter((material) => fitting.minGrip[material] !== undefined)
  const facts: Fact[] = [
    { label: 'Id', value: fitting.id },
    { label: 'Mount', value: mountWords[fitting.mount].long },
    ...[...fittingLengths, ...fittingExtras].map(({ key, label, hint }) => ({
      label,
      value: length(fitting[key]),
      meaning: hint,
    })),
    { label: angleWords.label, value: `${fitting.maxAngle}°`, meaning: angleWords.hint },
    {
      label: ratingWords.label,
      value: fitting.rating === undefined ? 'not set' : forceText(fitting.rating, force),
      meaning: ratingWords.hint,
    },
    {
      label: priceWords.label,
      value: fitting.price === undefined ? 'not set' : moneyToMain(fitting.price).toFixed(2),
      meaning: priceWords.hint,
    },
    { ...words(suitWords.materials), value: fitting.materials.join(', ') },
    { ...words(suitWords.cables), value: fitting.cables.map((id) => nameOf(cables, id)).join(', ') },
    ...(fitting.mount === 'drilled'
      ? [
          {
            ...words(suitWords.minGrip),
            value: (
              <ul>
                {grips.map((material) => (
                  <li key={material}>
                    {material} {length(fitting.minGrip[material])}
                  </li>
                ))}
              </ul>
            ),
          },
          { ...words(suitWords.tap), value: fitting.tap.length === 0 ? 'none' : fitting.tap.join(', ') },
        ]
      : []),
  ]
  return (
    <>
      <FittingDrawing fitting={fitting} format={format} />
      <FactList facts={facts} />
    </>
  )
}

const words = ({ label, hint }: { label: string; hint: string }) => ({ label, meaning: hint })

const nameOf = (cables: readonly CableChoice[], id: string): string =>
  cables.find((cable) => cable.id === id)?.name ?? id
