import { describe, expect, it } from 'vitest'
import { surveySchema } from '@shared/schemas/survey'
import { applyOperation } from '@shared/survey/apply-operation'
import { surveyOperationSchema } from '@shared/survey/survey-operation'
import { surveyAsOperations } from '../../../../server/features/surveys/survey-as-operations'
import { workedExample } from '../../../factories/worked-example'

const blank = () =>
  surveySchema.parse({
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'mm', force: 'N' },
    title: 'Blank',
  })

describe('surveyAsOperations', () => {
  it('makes the same survey out of an empty one', () => {
    const { survey } = workedExample()
    survey.corners = [{ post: 'P2', angle: 90 }]
    survey.diagonals = [{ id: 'D1', from: 'P1', to: 'P3', value: survey.posts[0]!.along! }]
    const made = surveyAsOperations(survey)
      .map((operation) => surveyOperationSchema.parse(operation))
      .reduce(applyOperation, blank())
    expect(made).toEqual(survey)
  })

  it('splits a survey of many parts into groups that may be stored', () => {
    const { survey } = workedExample()
    const post = survey.posts[0]!
    survey.posts = Array.from({ length: 1000 }, (_, i) => ({ ...post, id: `P${i + 1}` }))
    survey.corners = Array.from({ length: 200 }, (_, i) => ({ post: `P${i + 1}`, angle: 90 }))
    const bay = survey.bays[0]!
    survey.bays = Array.from({ length: 999 }, (_, i) => ({
      ...bay,
      id: `B${i + 1}`,
      from: `P${i + 1}`,
      to: `P${i + 2}`,
    }))
    const operations = surveyAsOperations(survey)
    expect(operations.length).toBeGreaterThan(1)
    operations.forEach((operation) => expect(surveyOperationSchema.safeParse(operation).success).toBe(true))
    expect(operations.reduce(applyOperation, blank())).toEqual(survey)
  })
})
