import type { Finding } from '../schemas/finding'
import type { Run } from '../schemas/run'
import { layOutRun } from './course'
import { type CableFigures, figureRun, type RunFigures } from './figure-run'
import { toFinding } from './findings/notice'
import { runFindings } from './findings/run-findings'
import { runReadingThatMatters, siteOnlyNotice } from './findings/site-only'
import type { CableResult, RunResult } from './result'
import { settledFitting } from './run-ends'
import type { SurveyIndex } from './survey-index'

/** One run of the survey: its cables and what was noticed. */
export function calculateRun(index: SurveyIndex, run: Run): { result: RunResult; findings: Finding[] } {
  const course = layOutRun(index, run)
  const figures = course && figureRun(index, course)
  if (!figures) return brokenRun(index, run)
  const matters = runReadingThatMatters(index, figures)
  const notices = runFindings(index, figures)
  if (matters) notices.push(siteOnlyNotice(figures, matters))
  const { units } = index.survey
  return {
    result: {
      run: run.id,
      cable: run.cable,
      tension: figures.course.tension,
      fromPost: figures.ends.from.post.post.id,
      toPost: figures.ends.to.post.post.id,
      cables: figures.cables.map((cable) => cableResult(figures, cable)),
      ...(matters ? { readingThatMatters: matters } : {}),
    },
    findings: notices.map((notice) => toFinding(notice, units)),
  }
}

/** What a cable comes to, of all that was worked out about it. */
export function cableResult(figures: RunFigures, cable: CableFigures): CableResult {
  const name = { run: figures.course.run.id, cable: cable.number, height: cable.height }
  const { cut, path } = cable
  const from = settledFitting(figures.ends.from)?.id
  const to = settledFitting(figures.ends.to)?.id
  if (!cut || cut.mode === 'none' || !path || from === undefined || to === undefined) {
    const known = { path: path?.length, from, to, limit: cut?.limit, longest: cut?.longest }
    return { ...name, mode: 'none', why: cable.why ?? 'missing-reading', ...known }
  }
  const { planned, worst, limit, longest, u } = cut
  const common = { path: path.length, from, to, cut: cut.cut, u, planned, worst, limit, longest }
  return cut.mode === 'shop'
    ? { ...name, mode: 'shop', ...common, slack: cut.slack }
    : { ...name, mode: 'site', ...common, finish: cut.finish }
}

/** A run that names a bay or post which is not there. */
function brokenRun({ survey, rules }: SurveyIndex, run: Run): { result: RunResult; findings: Finding[] } {
  const phrase = [`Run ${run.id} names a bay or a post that the survey does not have. Choose its bays again.`]
  const notice = { level: 'stop', code: 'broken-run', where: { run: run.id }, phrase } as const
  const tension = run.tension ?? rules.tension
  return {
    result: { run: run.id, cable: run.cable, tension, fromPost: '', toPost: '', cables: [] },
    findings: [toFinding(notice, survey.units)],
  }
}
