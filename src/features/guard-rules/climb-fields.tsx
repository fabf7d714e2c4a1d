import type { GuardRules } from '@shared/schemas/guard-rules'
import { inches, millimetres } from '@shared/units/length'
import { Checkbox } from '@/components/choices'
import { LengthField } from '@/components/length-field'
import { Card } from '@/components/page'
import { allowed, refusalAt } from '@/lib/refusal'
import { SectionField, sectionAllowed } from './figure-field'
import type { RulesPartProps } from './load-fields'

type Climbable = NonNullable<GuardRules['climbable']>

/** Between which heights nothing may be climbed, where the rules say so. */
export const ClimbFields = (props: RulesPartProps) => {
  const { rules, onChange } = props
  const { climbable } = rules
  return (
    <Card title="Climbing">
      <Checkbox
        label="These rules say between which heights nothing may be climbed"
        checked={climbable !== undefined}
        onChange={(event) => onChange({ climbable: event.target.checked ? begun(rules) : undefined })}
      />
      {climbable ? <Band {...props} climbable={climbable} /> : null}
    </Card>
  )
}

function Band({ climbable, format, error, onChange }: RulesPartProps & { climbable: Climbable }) {
  const change = (fields: Partial<Climbable>) =>
    onChange({ climbable: { ...climbable, ...fields, basis: 'own' } })
  const refusal = (key: keyof Climbable, words: string) => refusalAt(error, `climbable.${key}`, words)
  return (
    <div className="grid grid-cols-2 gap-3">
      <LengthField
        label="Nothing climbable from"
        value={climbable.from}
        format={format}
        required
        error={refusal('from', allowed.zeroOrMore)}
        onChange={(from) => from !== undefined && from !== climbable.from && change({ from })}
      />
      <LengthField
        label="Nothing climbable to"
        value={climbable.to}
        format={format}
        required
        error={refusal('to', allowed.above)}
        onChange={(to) => to !== undefined && to !== climbable.to && change({ to })}
      />
      <LengthField
        label="At a fall over"
        hint="Left empty, at any fall."
        value={climbable.fallOver}
        format={format}
        error={refusal('fallOver', allowed.zeroOrMore)}
        onChange={(fallOver) => fallOver !== climbable.fallOver && change({ fallOver })}
      />
      <SectionField
        of="nothing climbable"
        source={climbable}
        error={refusal('section', sectionAllowed)}
        onChange={change}
      />
      <div className="col-span-2">
        <Checkbox
          label="To be avoided rather than forbidden"
          checked={climbable.advice === true}
          onChange={(event) => change({ advice: event.target.checked })}
        />
      </div>
    </div>
  )
}

/** A band to begin with, up to the height of the guard. */
const begun = ({ situations, units }: GuardRules): Climbable => ({
  from: units.length === 'mm' ? millimetres(150) : inches(6),
  to: situations[0]?.height.value ?? inches(36),
  section: 'own rule',
  basis: 'own',
})
