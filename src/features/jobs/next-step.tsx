import type { ReactNode } from 'react'
import { type Job, type Stage, stages } from '@shared/schemas/job'
import { Button } from '@/components/button'
import { Menu, MenuItem, MenuLabel } from '@/components/menu'
import { Card } from '@/components/page'
import { ErrorNote } from '@/components/states'
import { sayDone, sayProblem } from '@/components/toast'
import { messageOf } from '@/lib/api-error'
import { useMoveJob } from './api/move-job'
import { nextStep, stageAfter } from './stage-words'

interface NextStepProps {
  job: Job
  mayMove: boolean
  /** Where this step is done, if that is a page of the program. */
  action?: ReactNode
}

/** What the job needs next, where to do it, and moving the job on for those who may. */
export function NextStep({ job, mayMove, action }: NextStepProps) {
  const move = useMoveJob(job.id)
  const next = stageAfter(job.stage)
  const moveTo = (stage: Stage) => {
    const takeBack = () =>
      move.mutate(job.stage, { onError: (error) => sayProblem(`Not taken back. ${messageOf(error)}`) })
    move.mutate(stage, { onSuccess: () => sayDone(`Moved to ${stage}.`, takeBack) })
  }
  return (
    <Card title={nextStep[job.stage]}>
      <div className="flex flex-wrap items-center gap-2">
        {action}
        {mayMove && next ? (
          <Button look={action ? 'secondary' : 'primary'} busy={move.isPending} onClick={() => moveTo(next)}>
            Move on to {next}
          </Button>
        ) : null}
        {mayMove ? (
          <Menu
            trigger={
              <Button look="quiet" disabled={move.isPending}>
                Other stage
              </Button>
            }
          >
            <MenuLabel>Now at {job.stage}. Move the job to</MenuLabel>
            {stages
              .filter((stage) => stage !== job.stage)
              .map((stage) => (
                <MenuItem key={stage} onSelect={() => moveTo(stage)}>
                  {stage}
                </MenuItem>
              ))}
          </Menu>
        ) : null}
      </div>
      {mayMove ? null : <p className="mt-2 text-soft">An estimator or owner moves the job on.</p>}
      {move.error ? (
        <div className="mt-3">
          <ErrorNote message={messageOf(move.error)} />
        </div>
      ) : null}
    </Card>
  )
}
