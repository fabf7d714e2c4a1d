import { type ReactNode, useMemo } from 'react'
import { Link, useParams } from 'react-router-dom'
import { surveys as endpoints } from '@shared/endpoints/surveys'
import { allFindings } from '@shared/calculation/all-findings'
import { calculateSurvey } from '@shared/calculation/calculate-survey'
import { checkSurvey } from '@shared/calculation/checks/check-survey'
import { cutListRows } from '@shared/cut-list/cut-list-rows'
import { fittingsToPick } from '@shared/cut-list/fittings-to-pick'
import type { Finding } from '@shared/schemas/finding'
import { overrulingOf } from '@shared/survey/overrule'
import { buttonClasses, ButtonLink } from '@/components/button'
import { CutCautions } from '@/components/cautions'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { Findings, RunSection, Totals } from '@/features/cut-list/cut-list'
import { JudgedFinding } from '@/features/findings/judged-finding'
import { PickList } from '@/features/cut-list/pick-list'
import { useSession } from '@/features/session/session'
import { messageOf } from '@/lib/api-error'
import { momentText } from '@/lib/date-text'
import { StaleNote } from '../stale-note'
import { inputOf } from '../calculation-input'
import { FollowedRules } from '../followed-rules'
import { GoThere } from '../go-there'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'
import { type Loaded, useSurveyData } from '../survey-session'

export function Component() {
  const { surveyId = '' } = useParams()
  const { data, error, stale, readAt, retry } = useSurveyData(surveyId)
  if (error) {
    return (
      <Page title="Cut list">
        <ErrorNote message={messageOf(error)} onRetry={retry} />
      </Page>
    )
  }
  return data ? (
    <CutList
      loaded={data}
      note={stale ? <StaleNote readAt={readAt} error={stale} onRetry={retry} /> : null}
    />
  ) : (
    <Loading what="the cut list" />
  )
}

function CutList({ loaded, note }: { loaded: Loaded; note: ReactNode }) {
  const { company } = useSession()
  const { record } = loaded
  const { survey } = record
  const input = useMemo(() => inputOf(loaded), [loaded])
  const result = useMemo(() => calculateSurvey(input), [input])
  const list = useMemo(
    () => cutListRows({ ...result, findings: allFindings(result, checkSurvey(input)) }, input),
    [result, input],
  )
  const picks = useMemo(() => fittingsToPick(result, input), [result, input])
  const format = lengthFormat(survey.units, company.fraction)
  const file = (path: string) => path.replace(':surveyId', record.id)
  const show = (finding: Finding) => (
    <JudgedFinding
      finding={finding}
      overruling={overrulingOf(survey, finding)}
      goThere={<GoThere surveyId={record.id} finding={finding} />}
    />
  )
  return (
    <Page
      title={`Cut list: ${survey.title}`}
      above={
        <>
          <Link to={paths.jobs}>Jobs</Link> / <Link to={paths.job(record.jobId)}>{record.jobTitle}</Link>
        </>
      }
      actions={
        <>
          <ButtonLink to={paths.survey(record.id)}>Survey</ButtonLink>
          <ButtonLink to={paths.findings(record.id)}>Findings</ButtonLink>
          <ButtonLink to={paths.checks(record.id)}>Checks</ButtonLink>
          <a className={buttonClasses('primary')} href={file(endpoints.exportWorkbook.path)} download>
            XLSX
          </a>
          <a className={buttonClasses('secondary')} href={file(endpoints.exportCsv.path)} download>
            CSV
          </a>
        </>
      }
    >
      <p className="mb-4 text-sm text-soft">
        Revision {record.revision} of the survey, last changed {momentText(record.updatedAt)}.
      </p>
      {note}
      {list.groups.length === 0 ? (
        <EmptyState
          title="No runs yet"
          action={
            <ButtonLink look="primary" to={paths.survey(record.id)}>
              To the survey
            </ButtonLink>
          }
        >
          Put posts on the photo and join them into bays; the runs follow by themselves.
        </EmptyState>
      ) : (
        <div className="flex flex-col gap-8">
          <p className="text-lg">
            <Totals totals={list.totals} format={format} />
          </p>
          <Findings findings={list.findings} show={show} />
          {list.groups.map((group) => (
            <RunSection
              key={group.run.run}
              group={group}
              format={format}
              workingOf={(run, cable) => paths.working(record.id, run, cable)}
              show={show}
            />
          ))}
          <PickList {...picks} format={format} />
          <FollowedRules loaded={loaded} />
          <CutCautions />
        </div>
      )}
    </Page>
  )
}
