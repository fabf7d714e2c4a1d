import { useQuery } from '@tanstack/react-query'
import { useState } from 'react'
import { Link, useNavigate, useParams } from 'react-router-dom'
import { surveys as surveyEndpoints } from '@shared/endpoints/surveys'
import { type Job, stages, type Stage } from '@shared/schemas/job'
import { Button } from '@/components/button'
import { SelectField } from '@/components/field'
import { Card, Page } from '@/components/page'
import { Sheet } from '@/components/sheet'
import { StageStepper } from '@/components/stage-stepper'
import { EmptyState, ErrorNote, Loading } from '@/components/states'
import { sayDone } from '@/components/toast'
import { jobQuery } from '@/features/jobs/api/read-job'
import { useMoveJob } from '@/features/jobs/api/save-job'
import { dateText, dueWords } from '@/features/jobs/due'
import { JobForm } from '@/features/jobs/job-form'
import { NewSurvey } from '@/features/jobs/new-survey'
import { nextStep, stageAfter } from '@/features/jobs/stage-words'
import { SurveyCards } from '@/features/jobs/survey-cards'
import { peopleQuery } from '@/features/people/api/list-people'
import { useMay } from '@/features/session/session'
import { thumbnailAddress } from '@/features/surveys/api/add-photo'
import { messageOf } from '@/lib/api-error'
import { paths } from '../paths'

const fileOf = (surveyId: string): string =>
  surveyEndpoints.exportSurveyFile.path.replace(':surveyId', surveyId)

export function Component() {
  const { jobId = '' } = useParams()
  const [sheet, setSheet] = useState<'edit' | 'survey' | null>(null)
  const navigate = useNavigate()
  const mayEdit = useMay('job:edit')
  const maySurvey = useMay('survey:edit')
  const people = useQuery(peopleQuery)
  const { data, error, isPending, refetch } = useQuery(jobQuery(jobId))
  if (isPending) return <Loading what="the job" />
  if (error) {
    return (
      <Page title="Job">
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
  return (
    <Page
      title={job.title}
      above={
        <>
          <Link to={paths.jobs}>Jobs</Link> / {job.number}
        </>
      }
      actions={mayEdit ? <Button onClick={() => setSheet('edit')}>Edit</Button> : null}
    >
      <div className="flex flex-col gap-6">
        <StageStepper stage={job.stage} />
        <NextStep job={job} />
        <section aria-label="Surveys">
          <div className="mb-3 flex flex-wrap items-center justify-between gap-2">
            <h2 className="text-lg font-semibold">Surveys</h2>
            {surveys.length > 0 ? newSurvey : null}
          </div>
          {surveys.length === 0 ? (
            <EmptyState title="Nothing measured yet" action={newSurvey}>
              A survey is the measured description of the site: photo, posts, bays and readings.
            </EmptyState>
          ) : (
            <SurveyCards surveys={surveys} thumbnailOf={thumbnailAddress} paths={paths} fileOf={fileOf} />
          )}
        </section>
        <Details job={job} />
      </div>
      <Sheet open={sheet === 'edit'} onOpenChange={() => setSheet(null)} title="Edit the job">
        <JobForm
          job={job}
          people={people.data ?? []}
          onSaved={() => {
            setSheet(null)
            sayDone('Saved.')
          }}
        />
      </Sheet>
      <Sheet open={sheet === 'survey'} onOpenChange={() => setSheet(null)} title="New survey">
        <NewSurvey jobId={job.id} onBegun={(id) => void navigate(paths.survey(id))} />
      </Sheet>
    </Page>
  )
}

/** What the job needs next, and moving it on for those who may. */
function NextStep({ job }: { job: Job }) {
  const move = useMoveJob(job.id)
  const mayMove = useMay('job:move')
  const next = stageAfter(job.stage)
  return (
    <Card title={nextStep[job.stage]}>
      {move.error ? <ErrorNote message={messageOf(move.error)} /> : null}
      {mayMove ? (
        <div className="flex flex-wrap items-end gap-3">
          {next ? (
            <Button busy={move.isPending} onClick={() => move.mutate(next)}>
              Move on to {next}
            </Button>
          ) : null}
          <SelectField
            className="w-40"
            label="Stage"
            value={job.stage}
            disabled={move.isPending}
            onChange={(event) => move.mutate(event.target.value as Stage)}
          >
            {stages.map((stage) => (
              <option key={stage}>{stage}</option>
            ))}
          </SelectField>
        </div>
      ) : (
        <p className="text-soft">An estimator or owner moves the job on.</p>
      )}
    </Card>
  )
}

function Details({ job }: { job: Job }) {
  const rows = [
    ['Customer', job.customer],
    ['Site', job.site],
    ['With', job.personName ?? ''],
    ['Due', job.due ? `${dateText(job.due)} (${dueWords(job.due, new Date())})` : ''],
    ['Opened', dateText(job.createdAt)],
    ['Notes', job.notes],
  ].filter(([, value]) => value !== '')
  return (
    <Card title="Details">
      <dl className="grid grid-cols-[auto_1fr] gap-x-6 gap-y-2">
        {rows.map(([label, value]) => (
          <div key={label} className="contents">
            <dt className="text-soft">{label}</dt>
            <dd className="min-w-0 whitespace-pre-line">{value}</dd>
          </div>
        ))}
      </dl>
    </Card>
  )
}
