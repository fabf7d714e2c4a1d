import sharp from 'sharp'
import { expect } from 'vitest'
import { surveys } from '@shared/endpoints/surveys'
import type { PhotoRecord } from '@shared/schemas/survey-record'
import { photoKey } from '../../../../server/adapters/photo-storage'
import { createPhotoRow } from '../../../factories/photo'
import { jpegBytes } from '../../../factories/picture'
import { createSurveyRow } from '../../../factories/survey-record'
import type { EndpointCase, Told } from '../../../support/endpoint-cases'
import type { Scene } from '../../../support/scene'

const surveyHere = ({ database, here }: Scene) => createSurveyRow(database, { companyId: here.company.id })

const photoHere = async (scene: Scene) => {
  const survey = await surveyHere(scene)
  const photo = await createPhotoRow(scene.database, survey)
  const { photoStorage } = scene.test.services
  await photoStorage.write(photoKey(survey.companyId, photo.id, 'picture'), await jpegBytes(64, 48))
  await photoStorage.write(photoKey(survey.companyId, photo.id, 'thumbnail'), await jpegBytes(16, 12))
  return { photoId: photo.id }
}

const isPicture =
  (width: number) =>
  async ({ answer }: Told) => {
    expect((await sharp(answer.body as Buffer).metadata()).width).toBe(width)
    expect(answer.headers['cache-control']).toBe('private, max-age=31536000, immutable')
    expect(answer.headers['x-content-type-options']).toBe('nosniff')
  }

export const cases: EndpointCase[] = [
  {
    endpoint: surveys.addPhoto,
    request: async (scene) => ({
      params: { surveyId: (await surveyHere(scene)).id },
      attach: [{ field: 'photo', bytes: await jpegBytes(64, 48), fileName: 'deck.jpg', type: 'image/jpeg' }],
    }),
    works: async ({ answer, client }) => {
      const photo = answer.body as PhotoRecord
      expect(photo).toMatchObject({ surveyPhotoId: 'F1', name: 'deck.jpg', width: 64, height: 48 })
      const picture = await client.send(surveys.readPicture, { params: { photoId: photo.id } })
      expect(picture.body).toHaveLength(photo.bytes)
    },
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.readPicture,
    request: async (scene) => ({ params: await photoHere(scene) }),
    works: isPicture(64),
    otherCompany: 'not found',
  },
  {
    endpoint: surveys.readThumbnail,
    request: async (scene) => ({ params: await photoHere(scene) }),
    works: isPicture(16),
    otherCompany: 'not found',
  },
]
