import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { listJobSurveys, readSurvey, removeSurvey } from '../../../../server/features/surveys/surveys.service'
import { createJob, type JobRow } from '../../../factories/job'
import { createPhotoRow } from '../../../factories/photo'
import { createSurveyRow, emptySurvey } from '../../../factories/survey-record'
import { workedExample } from '../../../factories/worked-example'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'

let test: TestDatabase
beforeAll(async () => {
  test = await openTestDatabase()
})
afterAll(() => test.close())

let job: JobRow
beforeEach(async () => {
  await test.reset()
  job = await createJob(test.database)
})
const place = () => ({ companyId: job.companyId, jobId: job.id })
const surveyIn = (survey = emptySurvey()) => createSurveyRow(test.database, { ...place(), survey })

describe('the surveys of a job', () => {
  it('come with counts and the picture that was marked first', async () => {
    const { survey } = workedExample()
    survey.photos = [{ id: 'F2', file: 'b.jpg', posts: {} }]
    const row = await surveyIn(survey)
    await createPhotoRow(test.database, row, { surveyPhotoId: 'F1' })
    const marked = await createPhotoRow(test.database, row, { surveyPhotoId: 'F2' })
    await surveyIn()
    const list = await listJobSurveys(test.database, place())
    expect(list).toHaveLength(2)
    expect(list[0]).toMatchObject({
      id: row.id,
      title: 'Two bays',
      posts: 3,
      bays: 2,
      thumbnailPhotoId: marked.id,
    })
    expect(list[1]).toMatchObject({ posts: 0, bays: 0, thumbnailPhotoId: null })
  })

  it('show the first stored picture while none is marked', async () => {
    const row = await surveyIn()
    const stored = await createPhotoRow(test.database, row, { surveyPhotoId: 'F1' })
    await createPhotoRow(test.database, row, { surveyPhotoId: 'F2' })
    expect((await listJobSurveys(test.database, place()))[0]?.thumbnailPhotoId).toBe(stored.id)
  })

  it('are those of the company and the job alone', async () => {
    await createSurveyRow(test.database)
    await createSurveyRow(test.database, { companyId: job.companyId })
    expect(await listJobSurveys(test.database, place())).toEqual([])
    expect(
      await listJobSurveys(test.database, {
        ...place(),
        companyId: (await createJob(test.database)).companyId,
      }),
    ).toEqual([])
  })
})

describe('a survey put away', () => {
  it('is no longer found, and stays in the database', async () => {
    const row = await surveyIn()
    const key = { companyId: row.companyId, surveyId: row.id }
    await removeSurvey(test.database, key, new Date())
    await expect(readSurvey(test.database, key)).rejects.toMatchObject({ status: 404 })
    await expect(removeSurvey(test.database, key, new Date())).rejects.toMatchObject({ status: 404 })
    expect(await listJobSurveys(test.database, place())).toEqual([])
    const [kept] = await test.sql`select removed_at from surveys where id = ${row.id}`
    expect(kept?.['removed_at']).not.toBeNull()
  })
})
