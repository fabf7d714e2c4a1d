import type { GuardRules } from '@shared/schemas/guard-rules'
import type { LengthFormat } from '@shared/units/format-length'
import { inches, millimetres } from '@shared/units/length'
import { ForceField } from '@/components/force-field'
import { LengthField } from '@/components/length-field'
import { Card } from '@/components/page'
import { allowed, refusalAt } from '@/lib/refusal'
import { SectionField, sectionAllowed } from './figure-field'
import { asOwn } from './own-copy'

export interface RulesPartProps {
  rules: GuardRules
  format: LengthFormat
  error: unknown
  onChange: (fields: Partial<GuardRules>) => void
}

/** Loads at the top and on a square of the infill. */
export const LoadFields = (props: RulesPartProps) => (
  <Card title="Loads">
    <div className="flex flex-col gap-3">
      <TopLoad {...props} />
      <InfillLoad {...props} />
      <p className="text-sm text-soft">Left empty, that load is not checked.</p>
    </div>
  </Card>
)

const TopLoad = ({ rules: { topLoad, units }, error, onChange }: RulesPartProps) => (
  <div className="grid grid-cols-2 gap-3">
    <ForceField
      label="At any point of the top"
      unit={units.force}
      value={topLoad?.value}
      error={refusalAt(error, 'topLoad.value', allowed.force)}
      onChange={(value) => {
        if (value !== topLoad?.value) {
          onChange({ topLoad: value === undefined ? undefined : asOwn(value, topLoad) })
        }
      }}
    />
    <SectionField
      of="load at the top"
      source={topLoad}
      error={refusalAt(error, 'topLoad.section', sectionAllowed)}
      onChange={(source) => topLoad && onChange({ topLoad: { ...topLoad, ...source } })}
    />
  </div>
)

function InfillLoad({ rules: { infillLoad, units }, format, error, onChange }: RulesPartProps) {
  const usualSide = units.length === 'mm' ? millimetres(300) : inches(12)
  return (
    <div className="grid grid-cols-2 gap-3">
      <ForceField
        label="On the infill"
        unit={units.force}
        value={infillLoad?.value}
        error={refusalAt(error, 'infillLoad.value', allowed.force)}
        onChange={(value) => {
          if (value === infillLoad?.value) return
          const side = infillLoad?.side ?? usualSide
          onChange({ infillLoad: value === undefined ? undefined : { side, ...asOwn(value, infillLoad) } })
        }}
      />
      <LengthField
        label="on a square of"
        value={infillLoad?.side}
        format={format}
        required
        disabled={!infillLoad}
        error={refusalAt(error, 'infillLoad.side', allowed.above)}
        onChange={(side) => {
          if (infillLoad && side !== undefined && side !== infillLoad.side) {
            onChange({ infillLoad: { ...infillLoad, side, basis: 'own' } })
          }
        }}
      />
      <SectionField
        of="load on the infill"
        source={infillLoad}
        error={refusalAt(error, 'infillLoad.section', sectionAllowed)}
        onChange={(source) => infillLoad && onChange({ infillLoad: { ...infillLoad, ...source } })}
      />
    </div>
  )
}
