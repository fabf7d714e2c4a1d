import type { Fitting } from '@shared/schemas/hardware'
import { coreSchema, type Material, materials } from '@shared/schemas/post'
import type { LengthFormat } from '@shared/units/format-length'
import type { Length } from '@shared/units/length'
import { LengthField } from '@/components/length-field'
import { CheckList } from './check-list'
import { suitWords } from './fitting-words'
import { allowed, refusalAt } from '@/lib/refusal'

export interface CableChoice {
  id: string
  name: string
}

interface FittingUsesProps {
  fitting: Fitting
  cables: readonly CableChoice[]
  format: LengthFormat
  error: unknown
  onChange: (fields: Partial<Fitting>) => void
}

const named = <Value extends string>(value: Value) => ({ value, label: value })

/** Which posts and cables a fitting is for. */
export function FittingUses({ fitting, cables, format, error, onChange }: FittingUsesProps) {
  return (
    <>
      <CheckList
        {...suitWords.materials}
        choices={materials.map(named)}
        value={fitting.materials}
        error={refusalAt(error, 'materials', 'Tick at least one.')}
        onChange={(given) => onChange({ materials: given })}
      />
      <CheckList
        {...suitWords.cables}
        choices={cables.map(({ id, name }) => ({ value: id, label: name }))}
        value={fitting.cables}
        error={refusalAt(error, 'cables', 'Tick at least one; add a cable first if there is none.')}
        onChange={(given) => onChange({ cables: given })}
      />
      {fitting.mount === 'drilled' ? (
        <>
          <LeastGrips fitting={fitting} format={format} error={error} onChange={onChange} />
          <CheckList
            {...suitWords.tap}
            choices={coreSchema.options.map(named)}
            value={fitting.tap}
            onChange={(tap) => onChange({ tap })}
          />
        </>
      ) : null}
    </>
  )
}

/** For every material, since a post without a known core counts as what is seen of it. */
function LeastGrips({ fitting, format, error, onChange }: Omit<FittingUsesProps, 'cables'>) {
  const setGrip = (material: Material, grip: Length | undefined) => {
    const { [material]: _before, ...others } = fitting.minGrip
    onChange({ minGrip: grip === undefined ? others : { ...others, [material]: grip } })
  }
  return (
    <fieldset className="min-w-0">
      <legend className="text-sm font-medium text-soft">{suitWords.minGrip.label}</legend>
      <p className="text-sm text-soft">{suitWords.minGrip.hint}</p>
      <div className="mt-2 grid grid-cols-2 gap-4 md:grid-cols-5">
        {materials.map((material) => (
          <LengthField
            key={material}
            label={`In ${material}`}
            value={fitting.minGrip[material]}
            format={format}
            error={refusalAt(error, `minGrip.${material}`, allowed.zeroOrMore)}
            onChange={(grip) => setGrip(material, grip)}
          />
        ))}
      </div>
    </fieldset>
  )
}
