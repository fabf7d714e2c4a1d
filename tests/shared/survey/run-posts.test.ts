import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { layOutRun } from '@shared/calculation/course'
import { starterHardware } from '@shared/calculation/starter-hardware'
import { starterRules } from '@shared/calculation/starter-rules'
import { indexSurvey } from '@shared/calculation/survey-index'
import { baysNamed, byId, firstBays, postsOfBays, sideOfPost } from '@shared/survey/run-posts'
import { anySurvey } from '../../support/survey-arbitrary'

describe('the posts of a run', () => {
  it.each([
    [[], []],
    [['A-B'], ['A', 'B']],
    [
      ['A-B', 'B-C'],
      ['A', 'B', 'C'],
    ],
    [
      ['B-A', 'C-B', 'C-D'],
      ['A', 'B', 'C', 'D'],
    ],
    [
      ['B-A', 'A-C'],
      ['B', 'A', 'C'],
    ],
  ])('of %j are %j', (bays, posts) => {
    const ends = bays.map((bay) => ({ from: bay.slice(0, 1), to: bay.slice(2) }))
    expect(postsOfBays(ends)).toEqual(posts)
  })
})

describe('the survey and the calculation', { timeout: 60_000 }, () => {
  it('agree on the posts of every run and on which size of each it takes', () => {
    fc.assert(
      fc.property(anySurvey, (survey) => {
        const index = indexSurvey({ survey, hardware: starterHardware, rules: starterRules })
        const first = firstBays(survey.bays)
        for (const run of survey.runs) {
          const posts = postsOfBays(baysNamed(byId(survey.bays), run.bays))
          const sides = posts.map((post) =>
            sideOfPost(
              { first: first.get(post), corner: survey.corners.find((corner) => corner.post === post) },
              run.bays,
            ),
          )
          const course = layOutRun(index, run)!
          expect(posts).toEqual(course.posts.map(({ post }) => post.id))
          expect(sides).toEqual(course.posts.map(({ side }) => side))
        }
      }),
      { numRuns: 300 },
    )
  })
})
