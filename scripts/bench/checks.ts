import { checkSurvey } from '../../shared/calculation/checks/check-survey'
import { calculateSurvey } from '../../shared/calculation/calculate-survey'
import { benchSurvey } from './calculate'
import { medianMs, rounded } from './measure'

const REPEATS = 50

/** `checkSurvey` over 200 runs of 12 cables, 600 bays: median time, against `calculateSurvey` of the same in the same run. */
// eslint-disable-next-line @typescript-eslint/require-await -- benches share one asynchronous shape
export async function benchChecks(): Promise<Record<string, unknown>> {
  const input = benchSurvey()
  for (let i = 0; i < 10; i += 1) {
    checkSurvey(input)
    calculateSurvey(input)
  }
  const median = medianMs(REPEATS, () => checkSurvey(input))
  const reference = medianMs(REPEATS, () => calculateSurvey(input))
  const { runs, bays, posts, findings } = checkSurvey(input)
  return {
    runs: runs.length,
    bays: bays.length,
    posts: posts.length,
    findings: findings.length,
    medianMs: rounded(median),
    aimMs: 100,
    reference: 'calculateSurvey of the same survey',
    referenceMs: rounded(reference),
    ratioToReference: rounded(median / reference, 1),
  }
}
