import { calculateSurvey } from '@shared/calculation/calculate-survey'
import type { CableResult } from '@shared/calculation/result'
import type { CalculationInput } from '@shared/calculation/survey-index'
import { readSurveyFile } from '@shared/schemas/survey-file'

type Part = Record<string, unknown>

/** The cable, the fitting and the rules printed in the survey file's description. */
export const exampleCable = {
  id: 'c532',
  name: '5/32 7x7 316',
  construction: '7x7',
  diameter: 0.15625,
  axialStiffness: 151000,
  settlingStretch: 0.00125,
  breakingLoad: 2400,
  price: 0,
}

export const exampleFitting = {
  id: 'F1',
  name: 'Example sleeve',
  mount: 'drilled',
  materials: ['softwood', 'hardwood'],
  cables: ['c532'],
  body: 1.5,
  headProjection: 0.25,
  cutPastFace: 1,
  takeUp: 0.75,
  maxAngle: 5,
  maxRun: 240,
  minGrip: { softwood: 1.5, hardwood: 1.25 },
  hole: 0.5625,
  spotFace: 0.625,
  tap: ['hardwood'],
  price: 0,
}

/** All limits zero: what is left is exact. */
export const noLimits = { readingLimit: 0, gaugeLimit: 0, cutLimit: 0, seatLimit: 0 }

export const post = (id: string, more: Part = {}): Part => ({
  id,
  material: 'softwood',
  along: 3.5,
  across: 3.5,
  ...more,
})

/** A bay read once at the top, and at the bottom where a second figure is given. */
export const bay = (id: string, ends: [from: string, to: string], read: number[], more: Part = {}): Part => ({
  id,
  from: ends[0],
  to: ends[1],
  readings: read.map((value, i) => ({ id: `r${i + 1}`, at: i === 0 ? 'top' : 'bottom', value })),
  ...more,
})

export interface Given {
  posts: Part[]
  bays: Part[]
  /** Left out: one run, R1, of all bays with one cable at 18 in. */
  runs?: Part[]
  /** More for that one run. */
  run?: Part
  guard?: Part
  corners?: Part[]
  rules?: Part
  cables?: Part[]
  fittings?: Part[]
  units?: { length: 'in' | 'mm'; force: 'lbf' | 'N' }
}

/** A survey file in inches (unless said) read as the program reads it; class II tape left out unless given. */
export function inputOf(given: Given): CalculationInput {
  const { posts, bays, guard = {}, corners = [], rules = {}, run = {} } = given
  const only = {
    id: 'R1',
    bays: bays.map(({ id }) => id),
    cable: 'c532',
    tension: 150,
    cables: { heights: [18] },
    ...run,
  }
  const file = readSurveyFile({
    survey: {
      format: 'tautbook.survey',
      version: 1,
      units: given.units ?? { length: 'in', force: 'lbf' },
      title: 'Test',
      guard,
      posts,
      bays,
      runs: given.runs ?? [only],
      corners,
    },
    hardware: { cables: given.cables ?? [exampleCable], fittings: given.fittings ?? [exampleFitting] },
    rules,
  })
  return { survey: file.survey, hardware: file.hardware!, rules: file.rules! }
}

export const calculate = (given: Given) => calculateSurvey(inputOf(given))

/** The only cable of a survey that has one. */
export function onlyCable(given: Given): CableResult {
  const { cables } = calculate(given)
  if (cables.length !== 1) throw new Error(`expected one cable, not ${cables.length}`)
  return cables[0]!
}

export const codes = (given: Given): string[] => calculate(given).findings.map(({ code }) => code)

/** Two softwood posts and one bay of 48 in. */
export const oneBay = (more: Partial<Given> = {}): Given => ({
  posts: [post('P1'), post('P2')],
  bays: [bay('B1', ['P1', 'P2'], [48])],
  ...more,
})
