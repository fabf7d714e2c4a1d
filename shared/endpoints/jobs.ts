import { z } from 'zod'
import { keySchema } from '../schemas/id'
import {
  jobChangesSchema,
  jobFieldsSchema,
  jobListQuerySchema,
  jobPageSchema,
  jobSchema,
  stageSchema,
} from '../schemas/job'
import { surveySummarySchema } from '../schemas/survey-record'
import { endpoint } from './endpoint'

const job = z.object({ jobId: keySchema })

export const jobs = {
  listJobs: endpoint({
    id: 'job.list',
    method: 'GET',
    path: '/api/jobs',
    gate: 'job:read',
    summary: 'A page of jobs, searched, filtered and sorted.',
    query: jobListQuerySchema,
    response: jobPageSchema,
  }),
  createJob: endpoint({
    id: 'job.create',
    method: 'POST',
    path: '/api/jobs',
    gate: 'job:create',
    summary: 'Open a job, at the stage measure.',
    body: jobFieldsSchema,
    response: jobSchema,
    status: 201,
  }),
  readJob: endpoint({
    id: 'job.read',
    method: 'GET',
    path: '/api/jobs/:jobId',
    gate: 'job:read',
    summary: 'One job and its surveys.',
    params: job,
    response: z.object({ job: jobSchema, surveys: z.array(surveySummarySchema) }),
  }),
  changeJob: endpoint({
    id: 'job.change',
    method: 'PATCH',
    path: '/api/jobs/:jobId',
    gate: 'job:edit',
    summary: 'Change what a job says.',
    params: job,
    body: jobChangesSchema,
    response: jobSchema,
  }),
  moveJob: endpoint({
    id: 'job.move',
    method: 'PUT',
    path: '/api/jobs/:jobId/stage',
    gate: 'job:move',
    summary: 'Move a job to another stage.',
    params: job,
    body: z.object({ stage: stageSchema }),
    response: jobSchema,
  }),
}
