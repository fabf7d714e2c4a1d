import { type ReactNode, useMemo } from 'react'
import { Link, useParams } from 'react-router-dom'
import { checkSurvey, type SurveyChecks } from '@shared/calculation/checks/check-survey'
import { surveys as endpoints } from '@shared/endpoints/surveys'
import { buttonClasses, ButtonLink } from '@/components/button'
import { GuardCautions } from '@/components/cautions'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { CornerSection } from '@/features/checks/corner-section'
import { figuresIn } from '@/features/checks/figures'
import { RunSection } from '@/features/checks/run-section'
import { messageOf } from '@/lib/api-error'
import { inputOf } from '../calculation-input'
import { FollowedRules } from '../followed-rules'
import { lengthFormat } from '../length-format'
import { paths } from '../paths'
import { StaleNote } from '../stale-note'
import { type Loaded, useSurveyData } from '../survey-session'

/** The figures that an inspector asks for, run by run, with pictures to scale. */
export function Component() {
  const { surveyId = '' } = useParams()
  const { data, error, stale, readAt, retry } = useSurveyData(surveyId)
  if (error) {
    return (
      <Page title="Checks">
        <ErrorNote message={messageOf(error)} onRetry={retry} />
      </Page>
    )
  }
  if (!data) return <Loading what="the checks" />
  return (
    <Checks loaded={data} note={stale ? <StaleNote readAt={readAt} error={stale} onRetry={retry} /> : null} />
  )
}

function Checks({ loaded, note }: { loaded: Loaded; note: ReactNode }) {
  const { record } = loaded
  const checks = useMemo(() => checkSurvey(inputOf(loaded)), [loaded])
  const missing = record.survey.runs.length - checks.runs.length
  return (
    <Page
      title={`Checks: ${record.survey.title}`}
      above={
        <>
          <Link to={paths.jobs}>Jobs</Link> / <Link to={paths.job(record.jobId)}>{record.jobTitle}</Link>
        </>
      }
      actions={
        <div className="contents print:hidden">
          <ButtonLink to={paths.survey(record.id)}>Survey</ButtonLink>
          <ButtonLink to={paths.findings(record.id)}>Findings</ButtonLink>
          <a
            className={buttonClasses('primary')}
            href={endpoints.exportGuardSummary.path.replace(':surveyId', record.id)}
            download
          >
            Guard summary, PDF
          </a>
        </div>
      }
    >
      {note}
      <div className="flex flex-col gap-8">
        <FollowedRules loaded={loaded} />
        {missing > 0 ? (
          <p>
            {missing === 1 ? 'One run is' : `${missing} runs are`} not checked yet: something is missing. The{' '}
            <Link to={paths.findings(record.id)}>findings</Link> say what.
          </p>
        ) : null}
        {checks.runs.length === 0 && missing === 0 ? (
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
        ) : null}
        <ChecksByRun checks={checks} loaded={loaded} />
        <GuardCautions />
      </div>
    </Page>
  )
}

/** Computed openings are shown finer than the house cuts: a sphere knows no sixteenths. */
const FINEST = 64

function ChecksByRun({ checks, loaded }: { checks: SurveyChecks; loaded: Loaded }) {
  const { survey } = loaded.record
  const { hardware, rules } = loaded
  const { units } = survey
  const context = { checks, rules, format: lengthFormat(units, FINEST), figures: figuresIn(units) }
  return (
    <>
      {checks.runs.map((run) => (
        <RunSection key={run.run} run={run} survey={survey} hardware={hardware} context={context} />
      ))}
      {checks.corners.length === 0 ? null : (
        <section aria-label="Corners" className="flex flex-col gap-5">
          <h2 className="text-lg font-semibold">Posts where two runs end</h2>
          {checks.corners.map((corner) => (
            <CornerSection
              key={`${corner.post} ${corner.a.run} ${corner.b.run}`}
              corner={corner}
              context={context}
            />
          ))}
        </section>
      )}
    </>
  )
}
