import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { Link, useNavigate, useParams } from 'react-router-dom'
import { surveys as surveyEndpoints } from '@shared/endpoints/surveys'
import type { Job, Stage } from '@shared/schemas/job'
import type { SurveySummary } from '@shared/schemas/survey-record'
import { Button, ButtonLink } from '@/components/button'
import { Page } from '@/components/page'
import { Sheet } from '@/components/sheet'
import { StageStepper } from '@/components/stage-stepper'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone } from '@/components/toast'
import { jobQuery } from '@/features/jobs/api/read-job'
import { Due } from '@/features/jobs/due-date'
import { JobDetails } from '@/features/jobs/job-details'
import { JobForm } from '@/features/jobs/job-form'
import { NewSurvey } from '@/features/jobs/new-survey'
import { NextStep } from '@/features/jobs/next-step'
import { RemoveSurvey } from '@/features/jobs/remove-survey'
import { SurveyCards } from '@/features/jobs/survey-cards'
import { peopleQuery } from '@/features/people/api/list-people'
import { useMay } from '@/features/session/session'
import { thumbnailAddress } from '@/features/surveys/api/add-photo'
import { messageOf } from '@/lib/api-error'
import { paths } from '../paths'

const fileOf = (surveyId: string): string =>
  surveyEndpoints.exportSurveyFile.path.replace(':surveyId', surveyId)

const back = (
  <Link to={paths.jobs} className="inline-block py-1 font-medium text-spruce underline">
    Jobs
  </Link>
)

/** Whether its due date is still waited for. */
const isOpen = ({ stage }: Job): boolean => stage !== 'done' && stage !== 'lost'

export function Component() {
  const { jobId = '' } = useParams()
  const [sheet, setSheet] = useState<'edit' | 'survey' | SurveySummary | null>(null)
  const navigate = useNavigate()
  const may = { edit: useMay('job:edit'), move: useMay('job:move'), remove: useMay('survey:remove') }
  const maySurvey = useMay('survey:edit')
  const people = useQuery(peopleQuery)
  const { data, error, isPending, refetch } = useQuery(jobQuery(jobId))
  if (isPending) return <Loading what="the job" />
  if (!data) {
    return (
      <Page title="Job" above={back}>
        <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} />
      </Page>
    )
  }
  const { job, surveys } = data
  const newSurvey = maySurvey ? (
    <Button look="primary" onClick={() => setSheet('survey')}>
      New survey
    </Button>
  ) : null
  // Then the first survey is the next step itself, and its button stands there.
  const toMeasure = job.stage === 'measure' && surveys.length === 0
  const close = () => setSheet(null)
  return (
    <Page
      title={job.title}
      above={
        <>
          {back} / No. {job.number}
          {isOpen(job) && job.due ? (
            <>
              {' · '}
              <Due job={job} />
            </>
          ) : null}
        </>
      }
      actions={may.edit ? <Button onClick={() => setSheet('edit')}>Edit</Button> : null}
    >
      <div className="grid items-start gap-6 lg:grid-cols-[minmax(0,2fr)_minmax(0,1fr)]">
        <div className="flex min-w-0 flex-col gap-6">
          <StageStepper stage={job.stage} />
          {error ? <ErrorNote message={messageOf(error)} onRetry={() => void refetch()} /> : null}
          <NextStep
            job={job}
            mayMove={may.move}
            action={toMeasure ? newSurvey : stepAction(job.stage, surveys)}
          />
          <section aria-label="Surveys">
            <div className="mb-3 flex flex-wrap items-center justify-between gap-2">
              <h2 className="text-lg font-semibold">Surveys</h2>
              {surveys.length > 0 ? newSurvey : null}
            </div>
            {surveys.length === 0 ? (
              <EmptyState title="Nothing measured yet" action={toMeasure ? null : newSurvey}>
                A survey is the measured description of the site: photo, posts, bays and readings.
              </EmptyState>
            ) : (
              <SurveyCards
                surveys={surveys}
                thumbnailOf={thumbnailAddress}
                paths={paths}
                fileOf={fileOf}
                {...(may.remove ? { onRemove: setSheet } : {})}
              />
            )}
          </section>
        </div>
        <JobDetails job={job} />
      </div>
      <Sheet open={sheet === 'edit'} onOpenChange={close} title="Edit the job">
        <JobForm
          job={job}
          people={people.data ?? []}
          onSaved={() => {
            close()
            sayDone('Saved.')
          }}
        />
      </Sheet>
      <Sheet open={sheet === 'survey'} onOpenChange={close} title="New survey">
        <NewSurvey jobId={job.id} onBegun={(id) => void navigate(paths.survey(id))} />
      </Sheet>
      {sheet !== null && typeof sheet === 'object' ? <RemoveSurvey survey={sheet} onClose={close} /> : null}
    </Page>
  )
}

/** The page where a stage's work is done; a job's newest survey stands for it. None where there is no such page yet. */
function stepAction(stage: Stage, surveys: readonly SurveySummary[]) {
  const survey = surveys.at(-1)
  if (!survey) return null
  if (stage === 'measure' && survey.gaps > 0) {
    return (
      <ButtonLink look="primary" to={paths.survey(survey.id)}>
        Go on measuring
      </ButtonLink>
    )
  }
  if (stage === 'check' || stage === 'shop') {
    return (
      <ButtonLink look="primary" to={paths.cutList(survey.id)}>
        See the cut list
      </ButtonLink>
    )
  }
  return null
}
