import { expect } from 'vitest'
import { jobs } from '@shared/endpoints/jobs'
import type { Job } from '@shared/schemas/job'
import { createJob } from '../../../factories/job'
import type { EndpointCase } from '../../../support/endpoint-cases'
import type { Scene } from '../../../support/scene'

const jobHere = ({ database, here }: Scene) => createJob(database, { companyId: here.company.id })

export const cases: EndpointCase[] = [
  {
    endpoint: jobs.listJobs,
    request: async (scene) => {
      await jobHere(scene)
      return {}
    },
    works: ({ answer }) => expect((answer.body as { jobs: Job[] }).jobs).toHaveLength(1),
    otherCompany: ({ answer }) => expect(answer.body).toEqual({ jobs: [], next: null }),
  },
  {
    endpoint: jobs.createJob,
    request: async ({ here }) => ({
      body: { title: 'Calloway, back deck', personId: (await here.person('surveyor')).id },
    }),
    works: ({ answer }) =>
      expect(answer.body).toMatchObject({ title: 'Calloway, back deck', number: 1, stage: 'measure' }),
    // The person named is not theirs.
    otherCompany: ({ answer }) => expect(answer.body).toMatchObject({ code: 'job-person-unknown' }),
  },
  {
    endpoint: jobs.readJob,
    request: async (scene) => ({ params: { jobId: (await jobHere(scene)).id } }),
    works: ({ answer, sent }) =>
      expect(answer.body).toMatchObject({ job: { id: sent.params?.['jobId'] }, surveys: [] }),
    otherCompany: 'not found',
  },
  {
    endpoint: jobs.changeJob,
    request: async (scene) => ({
      params: { jobId: (await jobHere(scene)).id },
      body: { title: 'Front steps', due: '2027-03-01' },
    }),
    works: ({ answer }) =>
      expect(answer.body).toMatchObject({ title: 'Front steps', due: '2027-03-01', site: '4 Orchard Lane' }),
    otherCompany: 'not found',
  },
  {
    endpoint: jobs.moveJob,
    request: async (scene) => ({ params: { jobId: (await jobHere(scene)).id }, body: { stage: 'check' } }),
    works: ({ answer }) => expect(answer.body).toMatchObject({ stage: 'check' }),
    otherCompany: 'not found',
  },
]
