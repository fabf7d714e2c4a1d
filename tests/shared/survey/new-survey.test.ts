import { expect, it } from 'vitest'
import { surveySchema } from '@shared/schemas/survey'
import { newSurvey } from '@shared/survey/new-survey'

it('is empty, valid and in the units asked for', () => {
  const survey = newSurvey('Harbour deck', { length: 'mm', force: 'N' })
  expect(surveySchema.parse(survey)).toEqual(survey)
  expect(survey).toMatchObject({
    title: 'Harbour deck',
    units: { length: 'mm', force: 'N' },
    posts: [],
    bays: [],
    runs: [],
    // IRC 2021 R312.1.2: 36 in
    guard: { height: 914_400_000 },
  })
})

it('wants a title', () => {
  expect(() => newSurvey('', { length: 'in', force: 'lbf' })).toThrow()
})
