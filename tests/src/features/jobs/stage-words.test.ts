import { expect, it } from 'vitest'
import { stageAfter } from '../../../../src/features/jobs/stage-words'

it('leads from measuring to done, one stage after the other', () => {
  const way = ['measure']
  for (let next = stageAfter('measure'); next; next = stageAfter(next)) way.push(next)
  expect(way).toEqual(['measure', 'check', 'price', 'agreed', 'shop', 'fit', 'done'])
})

it('leads nowhere from a lost job', () => {
  expect(stageAfter('lost')).toBeUndefined()
})
