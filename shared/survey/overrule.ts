import type { Finding, FindingPlace, Overrule } from '../schemas/finding'
import type { Survey } from '../schemas/survey'

type Overruled = Pick<Survey, 'overruled'>
/** What a finding is about: its code and its place. */
export interface Stop {
  code: string
  where: FindingPlace
}

const samePlace = (a: FindingPlace, b: FindingPlace): boolean =>
  a.post === b.post && a.bay === b.bay && a.run === b.run && a.cable === b.cable && a.reading === b.reading

/** Where in the list the overrule of a stop stands; undefined when it was never overruled. */
export function overrulePlace({ overruled }: Overruled, { code, where }: Stop): number | undefined {
  const place = overruled.findIndex((known) => known.code === code && samePlace(known.where, where))
  return place === -1 ? undefined : place
}

/** How a stop stands: overruled as it is now, or overruled once with other numbers, which no longer counts. */
export interface Overruling {
  overrule: Overrule
  stands: boolean
}

/** The overrule of a finding. @returns undefined when it was never overruled, or is no *stop* */
export function overrulingOf(survey: Overruled, finding: Finding): Overruling | undefined {
  const place = finding.level === 'stop' ? overrulePlace(survey, finding) : undefined
  const overrule = place === undefined ? undefined : survey.overruled[place]
  return overrule && { overrule, stands: overrule.text === finding.text }
}

/** Stops that say what is missing or cannot be: nobody's judgement gives a cable its length. */
const noMatterOfJudgement =
  /^(missing|impossible|broken)-|^(cable-unknown|no-cables|no-fitting|no-room|too-long)$/

/** Whether a stop is a judgement that somebody may take upon themselves. */
export const mayBeOverruled = ({ code }: Pick<Stop, 'code'>): boolean => !noMatterOfJudgement.test(code)

/** The stops that hold a survey back: those nobody overruled as they are now. */
export const standingStops = (survey: Overruled, findings: readonly Finding[]): Finding[] =>
  findings.filter((finding) => finding.level === 'stop' && !overrulingOf(survey, finding)?.stands)
