import type { RunCheck } from '@shared/calculation/checks/check-run'
import type { CheckContext } from './context'
import { type FigureLine, FigureList } from './figure-list'
import { foundAt, verdictOf } from './verdict'

const UNKNOWN = 'not in the hardware'

/** A run's tension, what cold and heat make of it, and what its parts take. */
export function RunFigures({ run, context }: { run: RunCheck; context: CheckContext }) {
  const { checks, rules, figures } = context
  const { tension, whenCold, whenHot, breakingLoad, rating } = run
  const found = foundAt(checks.findings, { run: run.run })
  const known = breakingLoad !== undefined || rating !== undefined
  const shares = (force: number) =>
    `Share of the breaking load: ${figures.share(force, breakingLoad)}; of the fitting’s rating: ${figures.share(force, rating)}.`
  const lines: FigureLine[] = [
    {
      label: `Tension at ${rules.tensionedAt} °C`,
      value: figures.force(tension),
      note: shares(tension),
      verdict: known ? verdictOf(found, 'tension-over-limit') : undefined,
    },
    {
      label: `In the cold, ${rules.coldest} °C`,
      value: figures.force(whenCold),
      note: shares(whenCold),
      verdict: known ? verdictOf(found, 'tension-over-limit', 'tension-over-limit-cold') : undefined,
    },
    {
      label: `In the heat, ${rules.hottest} °C`,
      value: whenHot > 0 ? figures.force(whenHot) : 'slack',
      note: 'Between posts that do not give; thermal expansion of type 316 by EN 10088-1.',
      verdict: verdictOf(found, 'slack-when-hot'),
    },
    { label: 'Limits: a cable breaks at', value: figures.force(breakingLoad, UNKNOWN) },
    {
      label: 'Limits: a fitting may carry',
      value: figures.force(rating, UNKNOWN),
      note: 'Never tension past the limit of fitting, cable or post.',
    },
  ]
  return <FigureList lines={lines} />
}
