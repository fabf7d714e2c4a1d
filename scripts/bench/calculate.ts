import { setFlagsFromString } from 'node:v8'
import { runInNewContext } from 'node:vm'
import { calculateSurvey } from '../../shared/calculation/calculate-survey'
import { starterHardware } from '../../shared/calculation/starter-hardware'
import { starterRules } from '../../shared/calculation/starter-rules'
import type { CalculationInput } from '../../shared/calculation/survey-index'
import { readSurveyFile } from '../../shared/schemas/survey-file'
import { medianMs, rounded } from './measure'

const RUNS = 200
const BAYS_PER_RUN = 3
const CABLES = 12
const REPEATS = 100

/** 200 runs of three bays and twelve cables, every fourth a stair; most are *shop*, some *site*. */
export function benchSurvey(): CalculationInput {
  const runs = Array.from({ length: RUNS }, (_, r) => r)
  const { survey } = readSurveyFile({
    survey: {
      format: 'tautbook.survey',
      version: 1,
      units: { length: 'in', force: 'lbf' },
      title: 'Bench',
      posts: runs.flatMap((r) =>
        Array.from({ length: BAYS_PER_RUN + 1 }, (_, p) => ({
          id: `P${r}-${p}`,
          material: r % 3 === 0 ? 'hardwood' : 'softwood',
          along: 3.5,
          across: 3.5,
        })),
      ),
      bays: runs.flatMap((r) => Array.from({ length: BAYS_PER_RUN }, (_, b) => benchBay(r, b))),
      runs: runs.map((r) => ({
        id: `R${r}`,
        bays: Array.from({ length: BAYS_PER_RUN }, (_, b) => `B${r}-${b}`),
        cable: 'c532',
        cables: { heights: Array.from({ length: CABLES }, (_, i) => 2.75 * (i + 1)) },
      })),
    },
  })
  return { survey, hardware: starterHardware, rules: starterRules }
}

const benchBay = (r: number, b: number) => ({
  id: `B${r}-${b}`,
  from: `P${r}-${b}`,
  to: `P${r}-${b + 1}`,
  ...(r % 4 === 0 ? { kind: 'stair', taped: 'level', rise: 52.5, going: 75 } : {}),
  readings: [
    { id: 'r1', at: 'top', value: 40 + ((r + b) % 17) / 2 },
    { id: 'r2', at: 'bottom', value: 40.125 + ((r + b) % 17) / 2 },
  ],
})

/**
 * The reference: a plain loop of comparable arithmetic, per cable the sum of its three bays and two posts, a root over
 * ten squared limits, a tangent and a rounding, into one flat array of numbers. No objects, no names, no findings.
 */
function referenceLoop(): number {
  const out = new Float64Array(RUNS * CABLES * 4)
  let at = 0
  for (let r = 0; r < RUNS; r += 1) {
    for (let c = 0; c < CABLES; c += 1) {
      let length = 0
      let squares = 0
      for (let b = 0; b < BAYS_PER_RUN; b += 1) {
        const clear = 40 + ((r + b) % 17) / 2 + ((2.75 * c - 3) / 30) * 0.125
        length += clear / Math.cos(0.6) + 3.5
        squares += 0.0625 ** 2 + (clear * Math.tan(0.6) * 0.0007) ** 2 + 0.03 ** 2
      }
      const u = Math.sqrt(squares)
      const cut = Math.ceil((length + 1.5 + u) / 0.0625) * 0.0625
      out.set([length, u, cut, cut - length], at)
      at += 4
    }
  }
  return out.reduce((sum, value) => sum + value, 0)
}

/** A full collection, so that what is measured is what is kept. */
function collectGarbage(): () => void {
  setFlagsFromString('--expose-gc')
  return runInNewContext('gc') as () => void
}

/** `calculateSurvey` over 200 runs of 12 cables: median time, against a plain loop in the same run, and heap growth. */
// eslint-disable-next-line @typescript-eslint/require-await -- benches share one asynchronous shape
export async function benchCalculate(): Promise<Record<string, unknown>> {
  const input = benchSurvey()
  const collect = collectGarbage()
  for (let i = 0; i < 20; i += 1) {
    calculateSurvey(input)
    referenceLoop()
  }
  collect()
  const heapBefore = process.memoryUsage().heapUsed
  const median = medianMs(REPEATS, () => calculateSurvey(input))
  collect()
  const heapGrowth = process.memoryUsage().heapUsed - heapBefore
  const reference = medianMs(REPEATS, referenceLoop)
  const result = calculateSurvey(input)
  return {
    runs: result.runs.length,
    cables: result.cables.length,
    repeats: REPEATS,
    medianMs: rounded(median),
    aimMs: 50,
    reference: 'plain loop: the same sums, roots, tangents and roundings into a flat array',
    referenceMs: rounded(reference),
    ratioToReference: rounded(median / reference, 1),
    heapGrowthBytes: heapGrowth,
  }
}
