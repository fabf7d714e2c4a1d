import type { ReactNode } from 'react'
import type { GuardFigures } from '@shared/calculation/checks/guard-figures'
import type { FigureSource } from '@shared/schemas/guard-rules'
import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { RuleSource } from '@/components/rule-source'
import { formatOfRules } from '@/lib/rules-format'
import type { AskedHeights } from './asked-heights'

interface Following {
  label: string
  value: ReactNode
  /** Undefined for a figure of the survey's own. */
  source?: FigureSource
}

/** What a guard is held to by its rules, with where each figure stands and how well it is known. */
export function FollowingFigures({ figures }: { figures: GuardFigures }) {
  const { rules } = figures
  if (!rules) return null
  return (
    <dl aria-label="What follows from these rules" className="flex flex-col text-sm">
      {followingOf(figures, formatOfRules(rules)).map(({ label, value, source }) => (
        <div key={label} className="border-b border-rule py-2 last:border-0">
          <dt className="text-soft">{label}</dt>
          <dd className="flex flex-wrap items-baseline gap-x-2">
            <span className="text-base font-medium">{value}</span>
            {source ? <RuleSource source={source} /> : <span className="text-soft">set in this survey</span>}
          </dd>
        </div>
      ))}
    </dl>
  )
}

function followingOf(figures: GuardFigures, format: LengthFormat): Following[] {
  const { guard, rules, situation } = figures
  if (!rules) return []
  const length = (value: number) => <Length value={value} format={format} />
  const from = (label: string, figure: (FigureSource & { value: number }) | undefined): Following[] =>
    figure ? [{ label, value: length(figure.value), source: figure }] : []
  const sphere = 'No sphere of this size may pass'
  const { upperSphere } = rules
  return [
    ...from('Height, at least', situation?.height),
    ...from('Height on stairs, at least', rules.stairHeight),
    ...(guard.sphere === undefined
      ? from(sphere, rules.sphere)
      : [{ label: sphere, value: length(guard.sphere) }]),
    ...(upperSphere && guard.sphere === undefined
      ? [
          {
            label: 'The same, higher up',
            value: (
              <>
                {length(upperSphere.value)} above {length(upperSphere.above)}
              </>
            ),
            source: upperSphere,
          },
        ]
      : []),
    ...(guard.stairSphere === undefined
      ? from(`${sphere} on stairs`, guard.sphere === undefined ? rules.stairSphere : undefined)
      : [{ label: `${sphere} on stairs`, value: length(guard.stairSphere) }]),
    ...from('Sphere at riser, tread and lowest cable', rules.stairTriangle),
  ]
}

/** What the rules ask for, as a sentence; on stairs only where that is another figure. */
export const AskedHeightsText = ({ asked, format }: { asked: AskedHeights; format: LengthFormat }) => (
  <p>
    These rules ask for <Length value={asked.height.value} format={format} />,{' '}
    <RuleSource source={asked.height} />
    {asked.stair && asked.stair !== asked.height ? (
      <>
        ; on stairs <Length value={asked.stair.value} format={format} />, <RuleSource source={asked.stair} />
      </>
    ) : null}
    .
  </p>
)
