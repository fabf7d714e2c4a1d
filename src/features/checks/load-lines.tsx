import type { BayCheck } from '@shared/calculation/checks/check-bay'
import type { RunCheck } from '@shared/calculation/checks/check-run'
import type { LookedUp } from '@shared/calculation/checks/wire-tables'
import { ruleBehind, rulesName } from '@shared/calculation/guard-rules/published-rules'
import { Length } from '@/components/length'
import { Computed } from './computed'
import type { CheckContext } from './context'
import type { FigureLine } from './figure-list'
import { type Found, verdictOf } from './verdict'

/** What forces the sphere through, smooth and at mid-span. */
export function pushLines({ push }: BayCheck, found: Found, { rules, figures }: CheckContext): FigureLine[] {
  if (push === undefined) return []
  const { leastPush } = rules
  return [
    {
      label: 'Push-through',
      value: figures.push(push),
      note:
        leastPush === undefined
          ? 'Forces the smooth sphere through. US codes set no force for it, nor does the house.'
          : `Forces the smooth sphere through. US codes set no force for it; the house asks for ${figures.push(leastPush)}.`,
      verdict: leastPush === undefined ? undefined : verdictOf(found, 'push-low'),
    },
  ]
}

/** One cable under its share of the infill load. */
export function infillLines(
  { infill }: BayCheck,
  { run, found }: { run: RunCheck; found: Found },
  { checks, format, figures }: CheckContext,
): FigureLine[] {
  const { rules } = checks.guard
  if (!rules) return []
  const load = rules.infillLoad
  if (!load) {
    return [{ label: 'Infill load', value: 'not set', note: `${rulesName(rules)} gives none here.` }]
  }
  if (!infill) return []
  const over = verdictOf(found, 'infill-overload')
  return [
    {
      label: 'Infill load: deflection',
      value: <Computed value={infill.deflection} format={format} />,
      note: (
        <>
          {figures.push(infill.load)} on one cable at mid-span, of {figures.force(load.value)} on a square of{' '}
          <Length value={load.side} format={format} />: {ruleBehind(rules, load)}
        </>
      ),
    },
    {
      label: 'Infill load: tension',
      value: figures.force(infill.tension),
      note: `Share of the breaking load: ${figures.share(infill.tension, run.breakingLoad)}; of the fitting’s rating: ${figures.share(infill.tension, run.rating)}.`,
      // Held against nothing, it does not hold.
      verdict: run.breakingLoad === undefined && run.rating === undefined ? undefined : over,
    },
  ]
}

const outside: Record<Extract<LookedUp, { found: 'not-tabulated' }>['because'], string> = {
  wire: 'This diameter and lay is not in the table.',
  spacing: 'The cables stand wider apart than any in the table.',
  distance: 'The span is wider than any in the table.',
}

/** What a wire table says, as a value and the row and column it was read at. */
function lookedUp(answer: LookedUp, write: (value: number) => string): { value: string; note: string } {
  if (answer.found === 'not-tabulated') return { value: 'not tabulated', note: outside[answer.because] }
  return {
    value: answer.found === 'value' ? write(answer.value) : 'x',
    note: `${answer.found === 'value' ? '' : 'Not allowed. '}Read at ${answer.spacing} mm spacing, ${answer.distance} mm span.`,
  }
}

/** The wire tables, where the rules go by them. */
export function wireLines(
  { wire }: BayCheck,
  { run, found }: { run: RunCheck; found: Found },
  { checks, figures }: CheckContext,
): FigureLine[] {
  const { rules } = checks.guard
  if (!wire || !rules?.wireTables) return []
  const rule = ruleBehind(rules, rules.wireTables)
  const least = lookedUp(wire.leastTension, figures.force)
  const most = lookedUp(wire.mostDeflection, (value) => `${value} mm`)
  return [
    {
      label: 'Wire table: least tension',
      value: least.value,
      note: `${least.note} The run has ${figures.force(run.tension)}. ${rule}`,
      verdict: verdictOf(found, 'wire-not-allowed', 'wire-tension-low', 'wire-not-tabulated'),
    },
    {
      label: 'Wire table: deflection under 2 kg',
      value: most.value,
      note:
        wire.mostDeflection.found === 'value' ? `${most.note} At most this proves the tension.` : most.note,
    },
  ]
}
