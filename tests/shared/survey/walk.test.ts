import fc from 'fast-check'
import { expect, it } from 'vitest'
import { walk } from '@shared/survey/walk'
import { aBay, aPost, surveyOf } from '../../factories/survey'
import { anySurvey } from '../../support/survey-arbitrary'

const names = (survey: Parameters<typeof walk>[0]) =>
  walk(survey).map((stop) => ('post' in stop ? stop.post : stop.bay))
const posts = ['P1', 'P2', 'P3', 'P4'].map((id) => aPost(id))

it('goes along a row from its end, however it was put in', () => {
  const bays = [aBay('B1', ['P3', 'P1']), aBay('B2', ['P2', 'P1'])]
  expect(names(surveyOf({ posts, bays }))).toEqual(['P2', 'B2', 'P1', 'B1', 'P3', 'P4'])
})

it('goes back to the fork when a branch ends', () => {
  const bays = [aBay('B1', ['P1', 'P2']), aBay('B2', ['P2', 'P3']), aBay('B3', ['P2', 'P4'])]
  expect(names(surveyOf({ posts, bays }))).toEqual(['P1', 'B1', 'P2', 'B2', 'P3', 'B3', 'P4'])
})

it('goes round a ring once, the closing bay last', () => {
  const bays = [aBay('B1', ['P1', 'P2']), aBay('B2', ['P2', 'P3']), aBay('B3', ['P3', 'P1'])]
  expect(names(surveyOf({ posts, bays }))).toEqual(['P1', 'B1', 'P2', 'B2', 'P3', 'B3', 'P4'])
})

it('passes every post and every bay of any survey exactly once', { timeout: 60_000 }, () => {
  fc.assert(
    fc.property(anySurvey, (survey) => {
      const all = [...survey.posts, ...survey.bays].map(({ id }) => id)
      expect(names(survey).sort()).toEqual(all.sort())
    }),
    { numRuns: 300 },
  )
})
