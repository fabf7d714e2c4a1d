import type { BayCheck } from '@shared/calculation/checks/check-bay'
import { topSphere } from '@shared/calculation/checks/findings/bay-check-findings'
import type { GuardFigures } from '@shared/calculation/checks/guard-figures'
import { ruleBehind } from '@shared/calculation/guard-rules/published-rules'
import { Length } from '@/components/length'
import { Computed } from './computed'
import type { CheckContext } from './context'
import type { FigureLine } from './figure-list'
import { type Found, verdictOf } from './verdict'

/** Where the sphere of a bay comes from: the survey's own figure, or a section of the rules. */
function sphereSource({ isStair }: BayCheck, { guard, rules }: GuardFigures): string {
  if (guard.sphere !== undefined || (isStair && guard.stairSphere !== undefined))
    return 'the survey’s own figure'
  if (!rules) return 'no guard rules are known; the usual sphere is taken'
  return ruleBehind(rules, (isStair ? rules.stairSphere : undefined) ?? rules.sphere)
}

/** The openings of a bay, each with the sphere that must not pass. */
export function openingLines(bay: BayCheck, found: Found, { checks, format }: CheckContext): FigureLine[] {
  const { between, bottom, top, pitch, above = 0 } = bay.openings
  const computed = (value: number) => <Computed value={value} format={format} />
  const less = (than: number, why?: string) => (
    <>
      less than <Length value={than} format={format} />
      {why ? `: ${why}` : ''}
    </>
  )
  const source = sphereSource(bay, checks.guard)
  const atTop = topSphere(bay, checks.guard)
  const { rules } = checks.guard
  const topSource =
    atTop !== bay.sphere && rules?.upperSphere ? ruleBehind(rules, rules.upperSphere) : undefined
  return [
    ...(between === undefined || pitch === undefined
      ? []
      : [
          {
            label: `Clear opening, cables ${above} and ${above + 1}`,
            value: computed(between),
            note: less(bay.sphere, source),
            verdict: verdictOf(found, 'opening-between'),
          },
          {
            label: bay.isStair ? 'Pitch, square to the cables' : 'Pitch, centre to centre',
            value: computed(pitch),
            note: 'the widest of the run',
          },
        ]),
    {
      label: 'Below the lowest cable',
      value: computed(bottom),
      note: less(bay.sphere, between === undefined ? source : undefined),
      verdict: verdictOf(found, 'opening-bottom'),
    },
    {
      label: 'Above the highest cable',
      value: computed(top),
      note: less(atTop, topSource),
      verdict: verdictOf(found, 'opening-top'),
    },
  ]
}

/** The sphere in the triangle of a step. */
export function triangleLines(
  { triangle }: BayCheck,
  found: Found,
  { checks, format }: CheckContext,
): FigureLine[] {
  const { rules } = checks.guard
  const limit = rules?.stairTriangle
  if (!triangle) return []
  const steps = (
    <>
      {triangle.assumed ? 'Steps reckoned' : 'Step measured'}: riser{' '}
      <Length value={triangle.riser} format={format} />, tread{' '}
      <Length value={triangle.tread} format={format} />
    </>
  )
  return [
    {
      label: 'Sphere in the stair triangle',
      value: <Computed value={triangle.sphere} format={format} />,
      note:
        rules && limit ? (
          <>
            less than <Length value={limit.value} format={format} />: {ruleBehind(rules, limit)}. {steps}
          </>
        ) : (
          steps
        ),
      verdict: limit ? verdictOf(found, 'opening-stair-triangle') : undefined,
    },
  ]
}

/** How far a cable spans, and the spacers that it needs. */
export function spanLines(bay: BayCheck, found: Found, { rules, format }: CheckContext): FigureLine[] {
  const { span, spacers, spacersNeeded } = bay
  const more = spacersNeeded - spacers
  return [
    {
      label: spacers === 0 ? 'Span' : `Span, with ${spacers} ${spacers === 1 ? 'spacer' : 'spacers'}`,
      value: <Computed value={span} format={format} />,
      note: (
        <>
          at most <Length value={rules.wideBay} format={format} />: the house rules
        </>
      ),
      verdict: verdictOf(found, 'wide-bay'),
    },
    {
      label: 'Spacers needed',
      value: spacersNeeded === 0 ? 'none' : `${spacersNeeded}`,
      note: more > 0 ? `${more} more than the bay has` : undefined,
    },
  ]
}
