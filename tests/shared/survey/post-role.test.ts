import { expect, it } from 'vitest'
import { postRole, runsAtPosts } from '@shared/survey/post-role'
import { aPost, aRow, aRun } from '../../factories/survey'

const survey = aRow([48, 48, 48], {
  posts: ['P1', 'P2', 'P3', 'P4', 'P5'].map((id) => aPost(id)),
  runs: [aRun('R1', ['B1', 'B2']), aRun('R2', ['B3'])],
})

it.each([
  ['P1', 'end'],
  ['P2', 'through'],
  ['P3', 'corner'],
  ['P4', 'end'],
  ['P5', undefined],
])('%s is %s', (post, role) => {
  expect(postRole(survey, post)).toBe(role)
})

it('is an end where two runs end and the angle was measured as straight', () => {
  expect(postRole({ ...survey, corners: [{ post: 'P3', angle: 180 }] }, 'P3')).toBe('end')
  expect(postRole({ ...survey, corners: [{ post: 'P3', angle: 90 }] }, 'P3')).toBe('corner')
})

it('names the runs that end and those that pass', () => {
  expect(runsAtPosts(survey).get('P3')).toEqual({ ends: ['R1', 'R2'], passes: [] })
  expect(runsAtPosts(survey).get('P2')).toEqual({ ends: [], passes: ['R1'] })
})
