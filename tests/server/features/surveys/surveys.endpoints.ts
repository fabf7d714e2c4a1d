import { randomUUID } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { expect } from 'vitest'
import { surveys, type SurveyHistoryEntry } from '@shared/endpoints/surveys'
import { readSurveyFile } from '@shared/schemas/survey-file'
import type { SurveyRecord } from '@shared/schemas/survey-record'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import { changeSurvey } from '../../../../server/features/surveys/change-survey.service'
import { listJobSurveys } from '../../../../server/features/surveys/surveys.service'
import { createJob } from '../../../factories/job'
import { createSurveyRow } from '../../../factories/survey-record'
import { workedExample } from '../../../factories/worked-example'
import type { EndpointCase, Told } from '../../../support/endpoint-cases'
import type { Scene } from '../../../support/scene'

const jobHere = async ({ database, here }: Scene) => ({
  jobId: (await createJob(database, { companyId: here.company.id })).id,
})
/** The worked example, of a job of `here`. */
const surveyHere = async ({ database, here }: Scene) => {
  const { id } = await createSurveyRow(database, {
    companyId: here.company.id,
    survey: workedExample().survey,
  })
  return { surveyId: id }
}

const file = (): object => {
  const path = new URL('../../../worked-examples/in/two-bays.json', import.meta.url)
  return { survey: (JSON.parse(readFileSync(path, 'utf8')) as { survey: object }).survey }
}

const operation: SurveyOperation = { type: 'post.add', post: { id: 'P9' } }

const surveysOf = async ({ scene, sent }: Told) =>
  listJobSurveys(scene.database, {
    companyId: scene.here.company.id,
    jobId: sent.params?.['jobId'] ?? '',
  })

export const cases: EndpointCase[] = [
  {
    endpoint: surveys.createSurvey,
    request: async (scene) => ({ params: await jobHere(scene), body: { title: 'Back deck' } }),
    works: async (told) => {
      const record = told.answer.body as SurveyRecord
      expect(record).toMatchObject({ revision: 0, survey: { title: 'Back deck', posts: [], bays: [] } })
      expect(record.survey.units).toEqual({ length: 'in', force: 'lbf' })
      expect((await surveysOf(told)).map(({ id }) => id)).toEqual([record.id])
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.importSurvey,
    request: async (scene) => ({ params: await jobHere(scene), body: file() }),
    works: async (told) => {
      const { survey, notes } = told.answer.body as { survey: SurveyRecord; notes: string[] }
      expect(survey.survey).toEqual(workedExample().survey)
      expect(notes).toEqual([])
      expect(await surveysOf(told)).toHaveLength(1)
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.readSurvey,
    request: async (scene) => ({ params: await surveyHere(scene) }),
    works: ({ answer, sent }) => {
      expect(answer.body).toMatchObject({ id: sent.params?.['surveyId'], photos: [], jobTitle: 'Back deck' })
      expect((answer.body as SurveyRecord).survey).toEqual(workedExample().survey)
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.changeSurvey,
    request: async (scene) => ({
      params: await surveyHere(scene),
      body: { revision: 0, changes: [{ id: randomUUID(), operation }] },
    }),
    works: async ({ answer, client, sent }) => {
      expect(answer.body).toEqual({ revision: 1 })
      const read = await client.send(surveys.readSurvey, { params: sent.params })
      expect((read.body as SurveyRecord).survey.posts.map(({ id }) => id)).toContain('P9')
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.removeSurvey,
    request: async (scene) => ({ params: await surveyHere(scene) }),
    works: async ({ client, sent }) => {
      expect((await client.send(surveys.readSurvey, { params: sent.params })).status).toBe(404)
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.readHistory,
    request: async (scene) => {
      const { surveyId } = await surveyHere(scene)
      await changeSurvey(scene.database, {
        survey: { companyId: scene.here.company.id, surveyId },
        person: await scene.here.person('surveyor'),
        revision: 0,
        changes: [{ id: randomUUID(), operation }],
        now: new Date(),
      })
      return { params: { surveyId }, query: { limit: 5 } }
    },
    works: async ({ answer, scene }) => {
      const { entries, next } = answer.body as { entries: SurveyHistoryEntry[]; next: number | null }
      expect(entries).toMatchObject([
        { revision: 1, operation, by: (await scene.here.person('surveyor')).name },
      ])
      expect(next).toBeNull()
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.exportSurveyFile,
    request: async (scene) => ({ params: await surveyHere(scene) }),
    works: ({ answer }) => {
      const written = readSurveyFile(answer.body)
      expect(written.survey).toEqual(workedExample().survey)
      expect(written.hardware?.cables.map(({ id }) => id)).toContain('c532')
      expect(written.rules?.tapeClass).toBe('II')
      expect(answer.headers['content-disposition']).toBe('attachment; filename="survey-1-two-bays.json"')
    },
    otherCompany: 'not found',
  },
]
