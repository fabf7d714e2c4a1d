import type { Router } from 'express'
import { jobs } from '@shared/endpoints/jobs'
import { route } from '../../http/route'
import type { Services } from '../../services'
import { changeJob, createJob, jobLister, moveJob, readJob } from './jobs.service'

export function jobsRoutes(router: Router, services: Services): void {
  const at = { router, services }
  const { database, clock } = services
  route(at, jobs.listJobs, jobLister(services.open))
  route(at, jobs.createJob, ({ companyId, body }) =>
    createJob(database, { companyId, fields: body, now: clock() }),
  )
  route(at, jobs.readJob, (call) => readJob(database, key(call)))
  route(at, jobs.changeJob, (call) => changeJob(database, key(call), { changes: call.body, now: clock() }))
  route(at, jobs.moveJob, (call) => moveJob(database, key(call), { ...call.body, now: clock() }))
}

const key = ({ companyId, params }: { companyId: string; params: { jobId: string } }) => ({
  companyId,
  jobId: params.jobId,
})
