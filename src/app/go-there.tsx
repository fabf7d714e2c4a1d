import type { Finding, FindingPlace } from '@shared/schemas/finding'
import { ButtonLink } from '@/components/button'
import { paths } from './paths'

/** Where on the survey's screen a finding is: what to have in hand, or the guard. */
export function placeInSurvey({ bay, post, run }: FindingPlace): string {
  if (bay) return `bay=${encodeURIComponent(bay)}`
  if (post) return `post=${encodeURIComponent(post)}`
  return run ? `run=${encodeURIComponent(run)}` : 'guard'
}

/** Leads from a finding to its place in the survey. */
export const GoThere = ({ surveyId, finding }: { surveyId: string; finding: Finding }) => (
  <ButtonLink look="quiet" to={`${paths.survey(surveyId)}?${placeInSurvey(finding.where)}`}>
    Go there
  </ButtonLink>
)
