import type { PostCheck, Support } from '@shared/calculation/checks/check-post'
import { ruleBehind } from '@shared/calculation/guard-rules/published-rules'
import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { Computed } from './computed'
import type { CheckContext } from './context'
import type { FigureLine } from './figure-list'
import { foundAt, type Found, verdictOf } from './verdict'

/** What pulls at a post, what it may take, and the wood a fitting leaves it. */
export function postLines(check: PostCheck, context: CheckContext): FigureLine[] {
  const { checks, figures } = context
  const found = foundAt(checks.findings, { run: check.run, post: check.post })
  return [
    {
      label: 'Pull of all cables',
      value: figures.force(check.pull),
      note: 'All at the run’s tension, none slack.',
    },
    supportLine(check, { support: 'propped', found }, context),
    supportLine(check, { support: 'cantilever', found }, context),
    allowableLine(check, context),
    ...topLoadLines(check, found, context),
    ...holeLines(check, found, context),
  ]
}

const supportWords: Record<Support, string> = { propped: 'Held by the top rail', cantilever: 'Standing free' }

const assumptions = {
  propped: 'The survey says that the top rail ties this post.',
  cantilever: 'The survey says that the top rail does not tie this post.',
  unknown: 'Nobody said whether the top rail ties this post: the worse is taken.',
}

function supportLine(
  check: PostCheck,
  { support, found }: { support: Support; found: Found },
  { figures, format }: CheckContext,
): FigureLine {
  const counts = (check.support ?? 'cantilever') === support
  const { moment, stress, deflection } = check[support]
  const gives = deflection === undefined ? '' : `, gives way ${deflectionText(deflection, format)}`
  const judged = counts && stress !== undefined && check.allowable !== undefined
  return {
    label: `${supportWords[support]}${counts ? ': this one counts' : ', for comparison'}`,
    value: stress === undefined ? figures.moment(moment) : figures.stress(stress),
    note: [
      ...(stress === undefined ? ['Moment alone.'] : [`moment ${figures.moment(moment)}${gives}.`]),
      ...(counts ? [assumptions[check.support ?? 'unknown']] : []),
    ].join(' '),
    verdict: judged ? verdictOf(found, 'post-overstressed') : undefined,
  }
}

/** mm to the survey's units. */
const deflectionText = (millimetres: number, { style }: LengthFormat): string =>
  style === 'millimetres' ? `${millimetres.toFixed(1)} mm` : `${(millimetres / 25.4).toFixed(3)}″`

const coreWords = { softwood: 'softwood', hardwood: 'hardwood', masonry: 'masonry', metal: 'metal' }

function allowableLine({ allowable, core }: PostCheck, { figures }: CheckContext): FigureLine {
  const label = 'Allowed in bending'
  if (!allowable) {
    const what = core ? `The core is ${coreWords[core]}` : 'What the core is was not noted'
    const isWood = core === 'softwood' || core === 'hardwood'
    return {
      label,
      value: 'ask the engineer',
      note: isWood
        ? `${what}; its sizes were not taken.`
        : `${what}: its strength and anchoring are not reckoned.`,
    }
  }
  const { lumber, wetFactor, stress } = allowable
  return {
    label,
    value: figures.stress(stress),
    note: (
      <>
        {lumber.name}: Fb {figures.stress(lumber.bending)} × C<sub>F</sub> {lumber.sizeFactor} × wet factor{' '}
        {wetFactor}. Starting values are those of the NDS Supplement, read in a copy: check the text. All
        other factors are the engineer’s.
      </>
    ),
  }
}

function topLoadLines(
  { topLoad, allowable }: PostCheck,
  found: Found,
  { checks, figures }: CheckContext,
): FigureLine[] {
  const { rules } = checks.guard
  if (!topLoad || !rules?.topLoad) return []
  return [
    {
      label: `${figures.force(topLoad.force)} at the top, standing free`,
      value: figures.stress(topLoad.stress, figures.moment(topLoad.moment)),
      note: `moment ${figures.moment(topLoad.moment)}: ${ruleBehind(rules, rules.topLoad)}`,
      verdict: allowable && topLoad.stress !== undefined ? verdictOf(found, 'post-top-load') : undefined,
    },
  ]
}

function holeLines(
  { fitting, backLeft, edgeLeft }: PostCheck,
  found: Found,
  { rules, format }: CheckContext,
): FigureLine[] {
  const least = (value: number) => (
    <>
      at least <Length value={value} format={format} />: the house rules
    </>
  )
  return [
    ...(backLeft === undefined
      ? []
      : [
          {
            label: 'Back wall left',
            value: <Computed value={backLeft} format={format} />,
            note: least(rules.backWall),
            verdict: 'holds' as const,
          },
        ]),
    ...(edgeLeft === undefined
      ? fitting?.mount === 'drilled' && fitting.hole === undefined
        ? [{ label: 'Edge distance left', value: 'hole not in the hardware' }]
        : []
      : [
          {
            label: 'Edge distance left, each side',
            value: <Computed value={edgeLeft} format={format} />,
            note: least(rules.edgeWall),
            verdict: verdictOf(found, 'edge-thin'),
          },
        ]),
  ]
}
