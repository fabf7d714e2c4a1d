import type { FigureSource, GuardRules } from '@shared/schemas/guard-rules'
import type { Units } from '@shared/schemas/quantities'
import { writeForce } from '@shared/units/format-force'
import { writeLength } from '@shared/units/format-length'

/** A figure of guard rules as it is read: what it is, its value in the rules' own units, and where it stands. */
export interface FigureLine {
  what: string
  value: string
  source: FigureSource
}

const lengthIn = (nm: number, { length }: Units): string =>
  writeLength(nm, length === 'mm' ? { style: 'millimetres' } : { style: 'inches', finest: 64 })

/** Figures that are one length, in the order they are read. */
export const lengthFigures = [
  ['neededOver', 'A guard is needed above a fall of'],
  ['stairHeight', 'Height on stairs, above the nosing line'],
  ['sphere', 'No sphere may pass of'],
  ['stairSphere', 'No sphere may pass on stairs of'],
  ['stairTriangle', 'No sphere in the stair triangle of'],
  ['riser', 'Tallest riser'],
  ['tread', 'Shortest tread'],
] as const satisfies readonly (readonly [keyof GuardRules, string])[]
export type LengthFigure = (typeof lengthFigures)[number][0]

/** Every figure of a set of guard rules. */
export function figureLines(rules: GuardRules): FigureLine[] {
  const { units } = rules
  const length = (nm: number) => lengthIn(nm, units)
  const lines: FigureLine[] = rules.situations.map(({ name, height, upToFall }) => ({
    what: `Height: ${name}${upToFall === undefined ? '' : `, fall up to ${length(upToFall)}`}`,
    value: `at least ${length(height.value)}`,
    source: height,
  }))
  for (const [key, what] of lengthFigures) {
    const figure = rules[key]
    if (figure) lines.push({ what, value: length(figure.value), source: figure })
  }
  const { handrail, upperSphere, topLoad, infillLoad, climbable, wireTables } = rules
  if (handrail) {
    const value = `${length(handrail.least)} to ${length(handrail.most)}`
    lines.push({ what: 'Top of a stair guard that is also the handrail', value, source: handrail })
  }
  if (upperSphere) {
    lines.push({
      what: `Above ${length(upperSphere.above)} no sphere may pass of`,
      value: length(upperSphere.value),
      source: upperSphere,
    })
  }
  if (topLoad) {
    lines.push({
      what: 'Load at any point of the top',
      value: writeForce(topLoad.value, units.force),
      source: topLoad,
    })
  }
  if (infillLoad) {
    lines.push({
      what: `Load on the infill, on a square of ${length(infillLoad.side)}`,
      value: writeForce(infillLoad.value, units.force),
      source: infillLoad,
    })
  }
  if (climbable) {
    const { fallOver, from, to, advice } = climbable
    lines.push({
      what: `${advice ? 'Climbable members to be avoided' : 'Nothing climbable'}${fallOver === undefined ? '' : `, at a fall over ${length(fallOver)}`}`,
      value: `${length(from)} to ${length(to)}`,
      source: climbable,
    })
  }
  if (wireTables) lines.push({ what: 'Wire barriers', value: 'by the tables', source: wireTables })
  return lines
}
