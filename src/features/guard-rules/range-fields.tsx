import type { FigureSource } from '@shared/schemas/guard-rules'
import { inches, type Length } from '@shared/units/length'
import { Checkbox } from '@/components/choices'
import { LengthField } from '@/components/length-field'
import { Card } from '@/components/page'
import { allowed, refusalAt } from '@/lib/refusal'
import { SectionField, sectionAllowed } from './figure-field'
import type { RulesPartProps } from './load-fields'

/** Figures of two lengths: the handrail’s band, and the larger sphere higher up. */
export const RangeFields = ({ rules, error, onChange, format }: RulesPartProps) => (
  <Card title="Handrail and the upper opening">
    <div className="flex flex-col gap-3">
      <Pair
        path="handrail"
        of="handrail"
        says="These rules say between which heights a handrail lies"
        labels={{ least: 'Handrail from', most: 'Handrail to' }}
        figure={rules.handrail}
        begun={{ least: inches(34), most: inches(38) }}
        format={format}
        error={error}
        onChange={(handrail) => onChange({ handrail })}
      />
      <Pair
        path="upperSphere"
        of="upper opening"
        says="These rules let a larger sphere pass higher up"
        labels={{ above: 'Above a height of', value: 'No sphere may pass there of' }}
        figure={rules.upperSphere}
        begun={{ above: inches(36), value: rules.sphere.value }}
        format={format}
        error={error}
        onChange={(upperSphere) => onChange({ upperSphere })}
      />
    </div>
  </Card>
)

/** Two lengths that stand in one place of the rules. */
type Two<Key extends string> = FigureSource & Record<Key, Length>

interface PairProps<Key extends string> extends Pick<RulesPartProps, 'format' | 'error'> {
  path: string
  of: string
  /** That the rules say something of it, as a sentence. */
  says: string
  labels: Record<Key, string>
  figure: Two<NoInfer<Key>> | undefined
  /** What the lengths are in the beginning. */
  begun: Record<NoInfer<Key>, Length>
  onChange: (figure: Two<NoInfer<Key>> | undefined) => void
}

function Pair<Key extends string>(props: PairProps<Key>) {
  const { path, of, says, labels, figure, begun, format, error, onChange } = props
  const source: FigureSource = { section: 'own rule', basis: 'own' }
  const keys = Object.keys(labels) as Key[]
  return (
    <div>
      <Checkbox
        label={says}
        checked={figure !== undefined}
        onChange={(event) => onChange(event.target.checked ? { ...begun, ...source } : undefined)}
      />
      {figure ? (
        <div className="grid grid-cols-2 gap-3">
          {keys.map((key) => (
            <LengthField
              key={key}
              label={labels[key]}
              value={figure[key]}
              format={format}
              required
              error={refusalAt(error, `${path}.${key}`, allowed.above)}
              onChange={(value) => {
                if (value !== undefined && value !== figure[key]) {
                  onChange({ ...figure, [key]: value, basis: 'own' })
                }
              }}
            />
          ))}
          <SectionField
            of={of}
            source={figure}
            error={refusalAt(error, `${path}.section`, sectionAllowed)}
            onChange={(given) => onChange({ ...figure, ...given })}
          />
        </div>
      ) : null}
    </div>
  )
}
