import { starterRules } from '../../shared/calculation/starter-rules'
import type { CalculationInput } from '../../shared/calculation/survey-index'
import { readSurveyFile } from '../../shared/schemas/survey-file'

const cable = {
  id: 'c532',
  name: '5/32 7x7 316',
  construction: '7x7',
  diameter: 0.15625,
  axialStiffness: 151000,
  breakingLoad: 2400,
}
const fitting = {
  id: 'F1',
  name: 'Drilled, 1 1/2 in body',
  mount: 'drilled',
  materials: ['softwood'],
  cables: ['c532'],
  body: 1.5,
  headProjection: 0.25,
  cutPastFace: 1,
  takeUp: 0.75,
  maxAngle: 5,
  minGrip: { softwood: 1.5 },
  hole: 0.5625,
}

/** A survey of so many one-bay runs, each with twelve cables (3 in spacing under 37 in), read to the sixteenth. */
export function longSurvey(runs: number): CalculationInput {
  const numbers = Array.from({ length: runs }, (_, i) => i + 1)
  const { survey, hardware } = readSurveyFile({
    survey: {
      format: 'tautbook.survey',
      version: 1,
      units: { length: 'in', force: 'lbf' },
      title: 'Long gallery',
      guard: { height: 38.5, topRailUnderside: 37 },
      posts: Array.from({ length: runs + 1 }, (_, i) => ({
        id: `P${i + 1}`,
        material: 'softwood',
        along: 3.5,
        across: 3.5,
      })),
      bays: numbers.map((n) => ({
        id: `B${n}`,
        from: `P${n}`,
        to: `P${n + 1}`,
        readings: [
          { id: 'r1', at: 'top', value: 40 + (n % 128) / 16 },
          { id: 'r2', at: 'bottom', value: 40 + ((n + 1) % 128) / 16 },
        ],
      })),
      runs: numbers.map((n) => ({ id: `R${n}`, bays: [`B${n}`], cable: 'c532' })),
    },
    hardware: { cables: [cable], fittings: [fitting] },
  })
  if (!hardware) throw new Error('The file above names its hardware.')
  return { survey, hardware, rules: starterRules }
}
