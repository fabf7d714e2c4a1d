import { useMemo } from 'react'
import { Link, useParams } from 'react-router-dom'
import { surveyFindings } from '@shared/calculation/survey-findings'
import { surveys as endpoints } from '@shared/endpoints/surveys'
import { overrulingOf } from '@shared/survey/overrule'
import { buttonClasses, ButtonLink } from '@/components/button'
import { CutCautions } from '@/components/cautions'
import { Page } from '@/components/page'
import { ErrorNote, Loading } from '@/components/states'
import { FindingLevels } from '@/features/findings/finding-levels'
import { JudgedFinding } from '@/features/findings/judged-finding'
import { messageOf } from '@/lib/api-error'
import { inputOf } from '../calculation-input'
import { FollowedRules } from '../followed-rules'
import { GoThere } from '../go-there'
import { paths } from '../paths'
import { StaleNote } from '../stale-note'
import { type Loaded, useSurveyData } from '../survey-session'
import { useOverruler } from '../use-overruler'

/** Everything noticed about a survey, by severity. */
export function Component() {
  const { surveyId = '' } = useParams()
  const { data, error, stale, readAt, retry } = useSurveyData(surveyId)
  if (error) {
    return (
      <Page title="Findings">
        <ErrorNote message={messageOf(error)} onRetry={retry} />
      </Page>
    )
  }
  if (!data) return <Loading what="the findings" />
  return (
    <Findings
      loaded={data}
      note={stale ? <StaleNote readAt={readAt} error={stale} onRetry={retry} /> : null}
    />
  )
}

function Findings({ loaded, note }: { loaded: Loaded; note: React.ReactNode }) {
  const { record } = loaded
  const findings = useMemo(() => surveyFindings(inputOf(loaded)), [loaded])
  const overruler = useOverruler(record)
  return (
    <Page
      title={`Findings: ${record.survey.title}`}
      above={
        <>
          <Link to={paths.jobs}>Jobs</Link> / <Link to={paths.job(record.jobId)}>{record.jobTitle}</Link>
        </>
      }
      actions={
        <>
          <ButtonLink to={paths.survey(record.id)}>Survey</ButtonLink>
          <ButtonLink to={paths.cutList(record.id)}>Cut list</ButtonLink>
          <ButtonLink to={paths.checks(record.id)}>Checks</ButtonLink>
          <a
            className={buttonClasses('primary')}
            href={endpoints.exportGuardSummary.path.replace(':surveyId', record.id)}
            download
          >
            Guard summary, PDF
          </a>
        </>
      }
    >
      {note}
      <div className="flex flex-col gap-6">
        <FollowedRules loaded={loaded} />
        <FindingLevels
          findings={findings}
          show={(finding) => (
            <JudgedFinding
              finding={finding}
              overruling={overrulingOf(record.survey, finding)}
              overruler={overruler}
              goThere={<GoThere surveyId={record.id} finding={finding} />}
            />
          )}
        />
        <CutCautions />
      </div>
    </Page>
  )
}
