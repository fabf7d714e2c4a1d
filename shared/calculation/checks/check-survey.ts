import type { Finding } from '../../schemas/finding'
import type { Run } from '../../schemas/run'
import { layOutRun } from '../course'
import { figureRun } from '../figure-run'
import { missingFindings } from '../findings/missing-findings'
import { type Notice, toFinding } from '../findings/notice'
import { once } from '../findings/once'
import { type CalculationInput, indexSurvey, type SurveyIndex } from '../survey-index'
import { type BayCheck, checkBay } from './check-bay'
import { type CornerCheck, checkCorners } from './check-corners'
import { checkPost, type PostCheck } from './check-post'
import { checkRun, type RunCheck } from './check-run'
import { asChecked, baySpans, type CheckedRun } from './checked-run'
import { bayCheckFindings } from './findings/bay-check-findings'
import { cornerFindings } from './findings/corner-findings'
import { guardFindings } from './findings/guard-findings'
import { postFindings } from './findings/post-findings'
import { runCheckFindings } from './findings/run-check-findings'
import { wireFindings } from './findings/wire-findings'
import { type GuardFigures, guardFigures } from './guard-figures'

/** What `checkSurvey` answers. A run with something missing is left out of all but the findings. */
export interface SurveyChecks {
  guard: GuardFigures
  runs: RunCheck[]
  bays: BayCheck[]
  /** One for each end of each run. */
  posts: PostCheck[]
  corners: CornerCheck[]
  findings: Finding[]
}

/**
 * The checks an inspector would ask for: sections 8 and 9 of the calculation.
 *
 * The guard's heights are held to the chosen rules; each bay's openings, push-through, infill load and spans, each end
 * post's pull, moment and stress, and each corner's holes are worked out and judged. It is arithmetic on what was
 * entered: local code, the authority having jurisdiction and a licensed engineer decide.
 * Units: nm, N, N·mm, N/mm².
 */
export function checkSurvey(input: CalculationInput): SurveyChecks {
  const index = indexSurvey(input)
  const guard = guardFigures(input.survey.guard, input.guardRules)
  const notices = guardFindings(index, guard)
  const checks: SurveyChecks = { guard, runs: [], bays: [], posts: [], corners: [], findings: [] }
  const checked: CheckedRun[] = []
  for (const run of input.survey.runs) {
    const { ready, missing } = prepare(index, run)
    notices.push(...missing)
    if (!ready) continue
    checked.push(ready)
    notices.push(...checkOne(ready, { index, guard, checks }))
  }
  checks.corners = checkCorners(checked, input.rules)
  notices.push(...checks.corners.flatMap((corner) => cornerFindings(corner, input.rules)))
  const findings = notices.map((notice) => toFinding(notice, input.survey.units))
  return { ...checks, findings: once(findings) }
}

/** Lays a run out. With something missing it is not checked, and what is missing is said. */
function prepare(index: SurveyIndex, run: Run): { ready?: CheckedRun; missing: Notice[] } {
  const course = layOutRun(index, run)
  const figures = course && figureRun(index, course)
  if (!figures) {
    const phrase = [
      `Run ${run.id} names a bay or a post that the survey does not have. Choose its bays again.`,
    ]
    return { missing: [{ level: 'stop', code: 'broken-run', where: { run: run.id }, phrase }] }
  }
  return { ready: asChecked(figures), missing: missingFindings(figures) }
}

/** Checks a run, its bays and the posts at its ends, adds the figures to `checks` and tells what was noticed. */
function checkOne(
  run: CheckedRun,
  { index, guard, checks }: { index: SurveyIndex; guard: GuardFigures; checks: SurveyChecks },
): Notice[] {
  const { rules } = index
  const ofRun = checkRun(run, rules)
  const { spans, unread } = baySpans(run, index)
  const bays = spans.flatMap((span) => checkBay(run, span, { guard, rules }) ?? [])
  const posts = [run.figures.ends.from, run.figures.ends.to].map((end) =>
    checkPost(run, end, { guard, rules }),
  )
  checks.runs.push(ofRun)
  checks.bays.push(...bays)
  checks.posts.push(...posts)
  const context = { guard, rules, run: ofRun }
  return [
    ...runCheckFindings(run, ofRun, rules),
    ...bays.flatMap((bay) => [...bayCheckFindings(bay, context), ...wireFindings(bay, context)]),
    ...unread.map((bay) => unreadNotice(ofRun.run, bay)),
    ...posts.flatMap((post) => postFindings(post, context)),
  ]
}

const unreadNotice = (run: string, bay: string): Notice => ({
  level: 'check',
  code: 'bay-unread',
  where: { run, bay },
  phrase: [
    `Run ${run}: bay ${bay} has no reading of its own, only the overall one, so its span and push were not checked. Tape it.`,
  ],
})
