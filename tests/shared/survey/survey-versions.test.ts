import { describe, expect, it } from 'vitest'
import { SURVEY_VERSION, surveySchema } from '@shared/schemas/survey'
import { SurveyTooNew, upgradeSurvey, type VersionStep, versionSteps } from '@shared/survey/survey-versions'
import { versionExamples } from './support/version-examples'

describe('the steps there are', () => {
  it('lead from version 1 to the present one, each by one, each with a name of its own', () => {
    expect(versionSteps.map(({ to }) => to)).toEqual(
      Array.from({ length: SURVEY_VERSION - 1 }, (_, i) => i + 2),
    )
    expect(new Set(versionSteps.map(({ name }) => name)).size).toBe(versionSteps.length)
  })

  it('each run here at least once, on a survey as the version before wrote it', () => {
    const ran = new Set<string>()
    const watched = versionSteps.map((step): VersionStep => ({
      ...step,
      up: (survey) => {
        ran.add(step.name)
        return step.up(survey)
      },
    }))
    expect(Object.keys(versionExamples)).toEqual(Array.from({ length: SURVEY_VERSION }, (_, i) => `${i + 1}`))
    for (const document of Object.values(versionExamples)) {
      expect(surveySchema.safeParse(upgradeSurvey(document, watched))).toMatchObject({ success: true })
    }
    expect([...ran].sort()).toEqual(versionSteps.map(({ name }) => name).sort())
  })
})

describe('bringing a survey up', () => {
  const steps: VersionStep[] = [
    { name: 'name becomes title', to: 2, up: ({ name, ...survey }) => ({ ...survey, title: name }) },
    { name: 'colour is dropped', to: 3, up: ({ colour: _colour, ...survey }) => survey },
  ]

  it('takes every step from the version it has, in order', () => {
    expect(upgradeSurvey({ version: 1, name: 'Deck', colour: 'red' }, steps)).toEqual({
      version: 3,
      title: 'Deck',
    })
    expect(upgradeSurvey({ version: 2, name: 'kept', colour: 'red' }, steps)).toEqual({
      version: 3,
      name: 'kept',
    })
    expect(upgradeSurvey({ version: 3, colour: 'kept' }, steps)).toEqual({ version: 3, colour: 'kept' })
  })

  it('refuses what a newer program wrote, in a sentence', () => {
    expect(() => upgradeSurvey({ version: SURVEY_VERSION + 1 })).toThrow(SurveyTooNew)
    expect(() => upgradeSurvey({ version: 4 }, steps)).toThrow(/newer Tautbook \(format 4/)
  })

  it.each([[null], ['survey'], [42], [{}], [{ version: 'one' }], [[]]])(
    'gives %j back for the schema to judge',
    (document) => {
      expect(upgradeSurvey(document, steps)).toBe(document)
    },
  )
})
