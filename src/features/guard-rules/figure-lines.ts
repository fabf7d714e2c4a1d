import type { Phrase } from '@shared/calculation/phrase'
import type { FigureSource, GuardRules } from '@shared/schemas/guard-rules'

/** A figure of guard rules as it is read: what it is, its value, and where it stands. */
export interface FigureLine {
  what: Phrase
  value: Phrase
  source: FigureSource
}

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
export const figureLines = (rules: GuardRules): FigureLine[] => [
  ...rules.situations.map(({ name, height, upToFall }) => ({
    what: [`Height: ${name}`, ...(upToFall === undefined ? [] : [', fall up to ', { length: upToFall }])],
    value: ['at least ', { length: height.value }],
    source: height,
  })),
  ...lengthFigures.flatMap(([key, what]) => {
    const figure = rules[key]
    return figure ? [{ what: [what], value: [{ length: figure.value }], source: figure }] : []
  }),
  ...bandLines(rules),
  ...loadLines(rules),
  ...(rules.wireTables
    ? [{ what: ['Wire barriers'], value: ['by the tables'], source: rules.wireTables }]
    : []),
]

function bandLines({ handrail, upperSphere, climbable }: GuardRules): FigureLine[] {
  const lines: FigureLine[] = []
  const band = (from: number, to: number): Phrase => [{ length: from }, ' to ', { length: to }]
  if (handrail) {
    const what = ['Top of a stair guard that is also the handrail']
    lines.push({ what, value: band(handrail.least, handrail.most), source: handrail })
  }
  if (upperSphere) {
    const what = ['Above ', { length: upperSphere.above }, ' no sphere may pass of']
    lines.push({ what, value: [{ length: upperSphere.value }], source: upperSphere })
  }
  if (climbable) {
    const { fallOver, from, to, advice } = climbable
    const what = [
      advice === true ? 'Climbable members to be avoided' : 'Nothing climbable',
      ...(fallOver === undefined ? [] : [', at a fall over ', { length: fallOver }]),
    ]
    lines.push({ what, value: band(from, to), source: climbable })
  }
  return lines
}

function loadLines({ topLoad, infillLoad }: GuardRules): FigureLine[] {
  const lines: FigureLine[] = []
  if (topLoad) {
    lines.push({ what: ['Load at any point of the top'], value: [{ force: topLoad.value }], source: topLoad })
  }
  if (infillLoad) {
    const what = ['Load on the infill, on a square of ', { length: infillLoad.side }]
    lines.push({ what, value: [{ force: infillLoad.value }], source: infillLoad })
  }
  return lines
}
