import { readFileSync } from 'node:fs'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import { surveys } from '@shared/endpoints/surveys'
import type { PhotoRecord, SurveyRecord } from '@shared/schemas/survey-record'
import { photos } from '../../../../server/database/tables/photos'
import { createPerson } from '../../../factories/person'
import { jpegBytes } from '../../../factories/picture'
import { createSurveyRow } from '../../../factories/survey-record'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'
import { type Client, type Sent, signedIn } from '../../../support/client'
import { createTestApp, type TestApp } from '../../../support/test-app'

let database: TestDatabase
let test: TestApp
let client: Client
let surveyId: string
beforeAll(async () => {
  database = await openTestDatabase()
})
afterAll(() => database.close())
beforeEach(async () => {
  await database.reset()
  test = createTestApp({ open: database })
  const person = await createPerson(database.database)
  surveyId = (await createSurveyRow(database.database, { companyId: person.companyId })).id
  client = await signedIn(test.app, person)
})

type File = NonNullable<Sent['attach']>[number]
const file = (bytes: Buffer, more: Partial<File> = {}): File => ({
  field: 'photo',
  bytes,
  fileName: 'photo.jpg',
  type: 'image/jpeg',
  ...more,
})
const upload = (...attach: File[]) => client.send(surveys.addPhoto, { params: { surveyId }, attach })
const refusal = async (...attach: File[]) => {
  const answer = await upload(...attach)
  expect(await database.database.select().from(photos)).toEqual([])
  expect(test.services.photoStorage.keys()).toEqual([])
  return { status: answer.status, ...(answer.body as { code: string; detail: string }) }
}

describe('uploading a photo', () => {
  it('of orientation 6 stores it upright, named for people, and the survey lists it', async () => {
    const bytes = readFileSync(new URL('../../../../demo/photos/mill-stair.jpg', import.meta.url))
    const answer = await upload(file(bytes, { fileName: 'mill-stair.jpg' }))
    expect(answer.status).toBe(201)
    expect(answer.body as PhotoRecord).toMatchObject({ width: 1500, height: 2000, name: 'mill-stair.jpg' })
    const read = await client.send(surveys.readSurvey, { params: { surveyId } })
    expect((read.body as SurveyRecord).photos).toEqual([answer.body])
  })

  it('takes names in any script', async () => {
    const answer = await upload(file(await jpegBytes(), { fileName: 'Terrasse süd 日本.jpg' }))
    expect((answer.body as PhotoRecord).name).toBe('Terrasse süd 日本.jpg')
  })

  it('refuses more than 25 MB', async () => {
    const { status, code, detail } = await refusal(file(Buffer.alloc(25 * 1024 * 1024 + 1, 7)))
    expect([status, code]).toEqual([413, 'photo-too-large'])
    expect(detail).toMatch(/25 MB/)
  })

  it('refuses HEIC with a sentence that says what to do on the phone', async () => {
    const heic = Buffer.concat([
      Buffer.from([0, 0, 0, 24]),
      Buffer.from('ftypheic\0\0\0\0mif1heic'),
      Buffer.alloc(900),
    ])
    const { status, code, detail } = await refusal(
      file(heic, { fileName: 'IMG_0001.HEIC', type: 'image/heic' }),
    )
    expect([status, code]).toEqual([415, 'photo-heic'])
    expect(detail).toMatch(/On the phone/)
  })

  it.each([
    ['a page called a photo', Buffer.from('<html><script>alert(1)</script></html>'), 415, 'photo-kind'],
    ['nothing', Buffer.alloc(0), 422, 'photo-empty'],
  ])('refuses %s', async (_what, bytes, status, code) => {
    expect(await refusal(file(bytes))).toMatchObject({ status, code })
  })

  it('refuses a photo that was cut off', async () => {
    const whole = await jpegBytes(300, 200)
    expect(await refusal(file(whole.subarray(0, whole.length / 2)))).toMatchObject({
      status: 422,
      code: 'photo-broken',
    })
  })

  it('refuses no photo, two photos and another field', async () => {
    const bytes = await jpegBytes()
    expect(await refusal()).toMatchObject({ status: 422, code: 'photo-missing' })
    expect(await refusal(file(bytes), file(bytes))).toMatchObject({ status: 400, code: 'upload-broken' })
    expect(await refusal(file(bytes, { field: 'picture' }))).toMatchObject({ code: 'upload-broken' })
  })
})
