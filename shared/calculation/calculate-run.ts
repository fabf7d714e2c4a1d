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

/**
 * What a cable comes to, of all that was worked out about it. Written out key by key: copying these many numbers by
 * spreading takes three times as long as all the arithmetic.
 */
export function cableResult(
  { course, ends }: RunFigures,
  { number, height, cut, path, why }: CableFigures,
): CableResult {
  const run = course.run.id
  const from = settledFitting(ends.from)?.id
  const to = settledFitting(ends.to)?.id
  if (!cut || cut.mode === 'none' || !path || from === undefined || to === undefined) {
    return {
      run,
      cable: number,
      height,
      mode: 'none',
      why: why ?? 'missing-reading',
      path: path?.length,
      from,
      to,
      limit: cut?.limit,
      longest: cut?.longest,
    }
  }
  return cut.mode === 'shop'
    ? {
        run,
        cable: number,
        height,
        mode: 'shop',
        path: path.length,
        from,
        to,
        cut: cut.cut,
        slack: cut.slack,
        u: cut.u,
        planned: cut.planned,
        worst: cut.worst,
        limit: cut.limit,
        longest: cut.longest,
      }
    : {
        run,
        cable: number,
        height,
        mode: 'site',
        path: path.length,
        from,
        to,
        cut: cut.cut,
        finish: cut.finish,
        u: cut.u,
        planned: cut.planned,
        worst: cut.worst,
        limit: cut.limit,
        longest: cut.longest,
      }
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
