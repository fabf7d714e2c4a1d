import { type ReactNode, useMemo } from 'react'
import { Link, useParams } from 'react-router-dom'
import { checkSurvey, type SurveyChecks } from '@shared/calculation/checks/check-survey'
import type { RunCheck } from '@shared/calculation/checks/check-run'
import { surveys as endpoints } from '@shared/endpoints/surveys'
import { inches } from '@shared/units/length'
import { buttonClasses, ButtonLink } from '@/components/button'
import { GuardCautions } from '@/components/cautions'
import { Page } from '@/components/page'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { BaySection } from '@/features/checks/bay-section'
import { figuresIn } from '@/features/checks/figures'
import { CornerSection, PostSection } from '@/features/checks/post-section'
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
        <>
          <ButtonLink to={paths.survey(record.id)}>Survey</ButtonLink>
          <ButtonLink to={paths.findings(record.id)}>Findings</ButtonLink>
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
        {checks.runs.map((run) => (
          <RunChecks key={run.run} run={run} checks={checks} loaded={loaded} />
        ))}
        <CornerChecks checks={checks} loaded={loaded} />
        <GuardCautions />
      </div>
    </Page>
  )
}

/** Computed openings are shown finer than the house cuts: a sphere knows no sixteenths. */
const FINEST = 64
/** Where a post's size was not taken: a nominal 4x4. */
const USUAL_POST = inches(3.5)

function RunChecks({ run, checks, loaded }: { run: RunCheck; checks: SurveyChecks; loaded: Loaded }) {
  const { record, hardware, rules } = loaded
  const { guard, posts, bays, units } = record.survey
  const format = lengthFormat(units, FINEST)
  const figures = figuresIn(units)
  const cable = hardware.cables.find(({ id }) => id === run.cable)
  const found = (where: { bay?: string; post?: string }): ReadonlySet<string> =>
    new Set(
      checks.findings
        .filter((finding) =>
          where.bay ? finding.where.bay === where.bay : finding.where.post === where.post,
        )
        .map(({ code }) => code),
    )
  return (
    <section aria-label={`Run ${run.run}`} className="flex flex-col gap-5">
      <div>
        <h2 className="text-lg font-semibold">Run {run.run}</h2>
        <p className="text-soft">
          {run.heights.length} × {cable?.name ?? run.cable}, tensioned to {figures.force(run.tension)} at{' '}
          {rules.tensionedAt} °C; between posts that do not give {figures.force(run.whenCold)} at{' '}
          {rules.coldest} °C and {run.whenHot > 0 ? figures.force(run.whenHot) : 'none'} at {rules.hottest}{' '}
          °C.
        </p>
      </div>
      {checks.bays
        .filter((bay) => bay.run === run.run)
        .map((bay) => {
          const from = bays.find(({ id }) => id === bay.bay)?.from
          return (
            <BaySection
              key={bay.bay}
              bay={bay}
              run={run}
              checks={checks}
              guardHeight={bay.isStair ? (guard.stair?.height ?? guard.height) : guard.height}
              postWidth={posts.find(({ id }) => id === from)?.along ?? USUAL_POST}
              diameter={cable?.diameter ?? 0}
              found={found({ bay: bay.bay })}
              format={format}
              figures={figures}
              leastPush={rules.leastPush}
            />
          )
        })}
      <div className="grid gap-6 lg:grid-cols-2">
        {checks.posts
          .filter((post) => post.run === run.run)
          .map((post) => (
            <PostSection
              key={post.post}
              post={post}
              found={found({ post: post.post })}
              format={format}
              figures={figures}
            />
          ))}
      </div>
    </section>
  )
}

function CornerChecks({ checks, loaded }: { checks: SurveyChecks; loaded: Loaded }) {
  const format = lengthFormat(loaded.record.survey.units, FINEST)
  if (checks.corners.length === 0) return null
  return (
    <section aria-label="Corners" className="flex flex-col gap-5">
      <h2 className="text-lg font-semibold">Posts where two runs end</h2>
      {checks.corners.map((corner) => (
        <CornerSection
          key={`${corner.post} ${corner.a.run} ${corner.b.run}`}
          corner={corner}
          format={format}
        />
      ))}
    </section>
  )
}
