import { randomUUID } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { SurveyOperation } from '@shared/survey/survey-operation'
import {
  memoryPhotoStorage,
  type MemoryPhotoStorage,
} from '../../../../server/adapters/fakes/memory-photo-storage'
import { photos } from '../../../../server/database/tables/photos'
import { addPhoto, readPicture } from '../../../../server/features/photos/photos.service'
import { changeSurvey } from '../../../../server/features/surveys/change-survey.service'
import { createPerson } from '../../../factories/person'
import { createPhotoRow } from '../../../factories/photo'
import { jpegBytes } from '../../../factories/picture'
import { createSurveyRow, emptySurvey, type SurveyRow } from '../../../factories/survey-record'
import { openTestDatabase, type TestDatabase } from '../../../setup/database'

let test: TestDatabase
let photoStorage: MemoryPhotoStorage
let survey: SurveyRow
beforeAll(async () => {
  test = await openTestDatabase()
})
afterAll(() => test.close())
beforeEach(async () => {
  await test.reset()
  photoStorage = memoryPhotoStorage()
  survey = await createSurveyRow(test.database)
})

const demo = readFileSync(new URL('../../../../demo/photos/mill-stair.jpg', import.meta.url))
const deps = () => ({ database: test.database, photoStorage })
const add = (bytes: Buffer, more: { keepPlace?: boolean; surveyId?: string; name?: string } = {}) =>
  addPhoto(deps(), {
    companyId: survey.companyId,
    surveyId: more.surveyId ?? survey.id,
    file: { bytes, name: more.name ?? 'stair.jpg', mediaType: 'image/jpeg' },
    keepPlace: more.keepPlace ?? false,
  })
/** Sends changes of the survey one after another, as a surveyor does. */
async function changer() {
  const person = await createPerson(test.database, { companyId: survey.companyId })
  let revision = 0
  return async (...operations: SurveyOperation[]) => {
    const changes = operations.map((operation) => ({ id: randomUUID(), operation }))
    const key = { companyId: survey.companyId, surveyId: survey.id }
    const request = { survey: key, person, revision, changes, now: new Date() }
    revision = (await changeSurvey(test.database, request)).revision
  }
}
const rows = () => test.database.select().from(photos)

describe('adding a photo', () => {
  it('stores an upright picture and a thumbnail under the company', async () => {
    const photo = await add(demo)
    expect(photo).toMatchObject({
      surveyPhotoId: 'F1',
      name: 'stair.jpg',
      width: 1500,
      height: 2000,
      takenAt: '2026-06-02T14:08:51',
      focalLength35: 26,
    })
    expect(photoStorage.keys().sort()).toEqual([
      `${survey.companyId}/${photo.id}/picture.jpg`,
      `${survey.companyId}/${photo.id}/thumbnail.jpg`,
    ])
  })

  it('keeps where it was taken only for a company that wants that', async () => {
    expect((await add(demo)).place).toBeNull()
    expect((await rows())[0]).toMatchObject({ latitude: null, longitude: null })
    const { place } = await add(demo, { keepPlace: true })
    expect(place?.latitude).toBeCloseTo(0.0871, 4)
  })

  it('gives each photo an id of its own, also when two come at once', async () => {
    const bytes = await jpegBytes()
    const ids = (await Promise.all([add(bytes), add(bytes), add(bytes)])).map(
      ({ surveyPhotoId }) => surveyPhotoId,
    )
    expect(ids.sort()).toEqual(['F1', 'F2', 'F3'])
  })

  it('uses no id again that the survey has given to a picture', async () => {
    const document = { ...emptySurvey(), photos: [{ id: 'F1', file: 'elsewhere.jpg', posts: {} }] }
    const other = await createSurveyRow(test.database, { companyId: survey.companyId, survey: document })
    expect((await add(await jpegBytes(), { surveyId: other.id })).surveyPhotoId).toBe('F2')
  })

  it('leaves neither row nor picture behind when the file is refused', async () => {
    await expect(add(demo.subarray(0, 100_000))).rejects.toMatchObject({ code: 'photo-broken', status: 422 })
    expect(await rows()).toEqual([])
    expect(photoStorage.keys()).toEqual([])
  })

  it('leaves neither row nor picture behind when the disk is full', async () => {
    photoStorage.failNextWrite()
    await expect(add(await jpegBytes())).rejects.toThrow(/no space left/)
    expect(await rows()).toEqual([])
    expect(photoStorage.keys()).toEqual([])
  })

  it('to a survey of another company or none finds no survey', async () => {
    const other = await createSurveyRow(test.database)
    await expect(add(await jpegBytes(), { surveyId: other.id })).rejects.toMatchObject({ status: 404 })
    expect(photoStorage.keys()).toEqual([])
  })

  const fill = async () => {
    for (let i = 1; i <= 100; i += 1) await createPhotoRow(test.database, survey, { surveyPhotoId: `F${i}` })
  }

  it('stops at a hundred', async () => {
    await fill()
    await expect(add(await jpegBytes())).rejects.toMatchObject({ status: 409, code: 'photo-too-many' })
    expect(photoStorage.keys()).toEqual([])
  })

  it('counts only what the survey still has: one removed makes room for one, and none once it is back', async () => {
    await fill()
    const change = await changer()
    const photos = ['F1', 'F2'].map((id) => ({ id, file: 'deck.jpg', posts: {} }))
    await change(...photos.map((photo) => ({ type: 'photo.add' as const, photo })))
    await change({ type: 'photo.remove', id: 'F1' })
    const gesture = [{ type: 'photo.remove' as const, id: 'F2' }]
    await change({ type: 'group', operations: gesture })
    await change({ type: 'photo.add', photo: photos[1]! })
    expect((await add(await jpegBytes())).surveyPhotoId).toBe('F101')
    await expect(add(await jpegBytes())).rejects.toMatchObject({ code: 'photo-too-many' })
    await change({ type: 'group', operations: gesture })
    expect((await add(await jpegBytes())).surveyPhotoId).toBe('F102')
  })
})

describe('reading a picture', () => {
  it('is for the company that owns it', async () => {
    const photo = await add(await jpegBytes())
    const place = { companyId: survey.companyId, photoId: photo.id, size: 'picture' as const }
    expect((await readPicture(deps(), place)).length).toBe(photo.bytes)
    const other = await createSurveyRow(test.database)
    await expect(readPicture(deps(), { ...place, companyId: other.companyId })).rejects.toMatchObject({
      status: 404,
    })
  })

  it('says not found when the file is gone', async () => {
    const row = await createPhotoRow(test.database, survey)
    const place = { companyId: survey.companyId, photoId: row.id, size: 'thumbnail' as const }
    await expect(readPicture(deps(), place)).rejects.toMatchObject({ status: 404 })
  })
})
