import type { BayCheck } from '@shared/calculation/checks/check-bay'
import type { SurveyChecks } from '@shared/calculation/checks/check-survey'
import type { LookedUp } from '@shared/calculation/checks/wire-tables'
import { ruleBehind } from '@shared/calculation/guard-rules/published-rules'
import type { FigureSource } from '@shared/schemas/guard-rules'
import type { LengthFormat } from '@shared/units/format-length'
import { Length } from '@/components/length'
import { BayPicture } from './bay-picture'
import type { BayDrawn } from './bay-shape'
import { FigureList, type FigureLine } from './figure-list'
import type { Figures } from './figures'

export interface BaySectionProps extends BayDrawn {
  checks: SurveyChecks
  /** The codes of what was found of this bay. */
  found: ReadonlySet<string>
  format: LengthFormat
  figures: Figures
  /** The house's least push, N. */
  leastPush: number | undefined
}

const openingCodes = ['opening-between', 'opening-bottom', 'opening-top']

/** One bay: its opening picture and the figures an inspector asks for. */
export function BaySection(props: BaySectionProps) {
  const { bay, run, found, format, guardHeight, postWidth, diameter } = props
  const holds = {
    openings: !openingCodes.some((code) => found.has(code)),
    triangle: !found.has('opening-stair-triangle'),
  }
  return (
    <section aria-label={`Bay ${bay.bay}`} className="flex flex-col gap-3">
      <h3 className="font-semibold">
        Bay {bay.bay}
        {bay.isStair ? ', stair' : ''}
      </h3>
      <div className="grid gap-4 lg:grid-cols-2">
        <BayPicture
          bay={bay}
          run={run}
          guardHeight={guardHeight}
          postWidth={postWidth}
          diameter={diameter}
          format={format}
          holds={holds}
        />
        <FigureList lines={[...openingLines(props), ...loadLines(props), ...wireLines(props)]} />
      </div>
    </section>
  )
}

const levelOf = (found: ReadonlySet<string>, code: string, level: 'stop' | 'check' = 'stop') =>
  found.has(code) ? level : undefined

function openingLines({ bay, checks, found, format }: BaySectionProps): FigureLine[] {
  const { rules } = checks.guard
  const source: FigureSource | undefined = bay.isStair ? (rules?.stairSphere ?? rules?.sphere) : rules?.sphere
  const sphere = (
    <>
      no sphere of <Length value={bay.sphere} format={format} />
      {rules && source ? `: ${ruleBehind(rules, source)}` : ''}
    </>
  )
  const computed = (value: number) => <Length value={value} format={format} look="computed" />
  const { between, bottom, top, pitch } = bay.openings
  const more = bay.spacersNeeded - bay.spacers
  return [
    ...(between === undefined || pitch === undefined
      ? []
      : [
          {
            label: `Widest opening, cables ${bay.openings.above} and ${(bay.openings.above ?? 0) + 1}`,
            value: computed(between),
            note: sphere,
            level: levelOf(found, 'opening-between'),
          },
          { label: 'Pitch, square to the cables', value: computed(pitch) },
        ]),
    { label: 'Below the lowest cable', value: computed(bottom), level: levelOf(found, 'opening-bottom') },
    { label: 'Above the highest cable', value: computed(top), level: levelOf(found, 'opening-top') },
    ...triangleLines(bay, { checks, found, format }),
    {
      label: bay.spacers > 0 ? `Span, with ${bay.spacers} spacers` : 'Span',
      value: computed(bay.span),
      note:
        more > 0
          ? `${more} ${bay.spacers > 0 ? 'more ' : ''}${more === 1 ? 'spacer is' : 'spacers are'} wanted`
          : 'no spacer is wanted',
      level: levelOf(found, 'wide-bay', 'check'),
    },
  ]
}

function triangleLines(
  { triangle }: BayCheck,
  { checks, found, format }: Pick<BaySectionProps, 'checks' | 'found' | 'format'>,
): FigureLine[] {
  const { rules } = checks.guard
  const limit = rules?.stairTriangle
  if (!triangle || !rules || !limit) return []
  return [
    {
      label: 'Sphere in the stair triangle',
      value: <Length value={triangle.sphere} format={format} look="computed" />,
      note: (
        <>
          none of <Length value={limit.value} format={format} />: {ruleBehind(rules, limit)}.{' '}
          {triangle.assumed ? 'Steps reckoned' : 'Step measured'}: riser{' '}
          <Length value={triangle.riser} format={format} />, tread{' '}
          <Length value={triangle.tread} format={format} />
        </>
      ),
      level: levelOf(found, 'opening-stair-triangle'),
    },
  ]
}

function loadLines({ bay, run, checks, found, format, figures, leastPush }: BaySectionProps): FigureLine[] {
  const { rules } = checks.guard
  const load = rules?.infillLoad
  return [
    ...(bay.push === undefined
      ? []
      : [
          {
            label: 'Push that forces the sphere through',
            value: figures.push(bay.push),
            note:
              leastPush === undefined
                ? 'No US code sets a force for the sphere; the house sets none either.'
                : `The house asks for ${figures.push(leastPush)}; no US code sets a force for the sphere.`,
            level: levelOf(found, 'push-low', 'check'),
          },
        ]),
    ...(bay.infill && rules && load
      ? [
          {
            label: 'Under the infill load a cable moves',
            value: <Length value={bay.infill.deflection} format={format} look="computed" />,
            note: (
              <>
                {figures.force(load.value)} on a square of <Length value={load.side} format={format} />, of
                which {figures.push(bay.infill.load)} on one cable: {ruleBehind(rules, load)}
              </>
            ),
          },
          {
            label: 'and is pulled with',
            value: figures.force(bay.infill.tension),
            note: `${figures.share(bay.infill.tension, run.breakingLoad)} of its breaking load; of the fitting’s rating: ${figures.share(bay.infill.tension, run.rating)}`,
            level: levelOf(found, 'infill-overload'),
          },
        ]
      : rules && !load
        ? [
            {
              label: 'Infill load',
              value: 'not set',
              note: `${rules.name} gives none here: ask the engineer.`,
            },
          ]
        : []),
  ]
}

const lookedUp = (found: LookedUp, write: (value: number) => string): string => {
  if (found.found === 'value') return write(found.value)
  return found.found === 'not-allowed' ? '× not allowed' : 'not in the tables'
}

function wireLines({ bay, found, figures }: BaySectionProps): FigureLine[] {
  const { wire } = bay
  if (!wire) return []
  const level =
    found.has('wire-not-allowed') || found.has('wire-tension-low')
      ? 'stop'
      : levelOf(found, 'wire-not-tabulated', 'check')
  return [
    { label: 'Least tension by the wire table', value: lookedUp(wire.leastTension, figures.force), level },
    {
      label: 'Largest deflection under 2 kg by the wire table',
      value: lookedUp(wire.mostDeflection, (value) => `${value} mm`),
    },
  ]
}
