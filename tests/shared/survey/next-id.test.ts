import { expect, it } from 'vitest'
import { nextId } from '@shared/survey/next-id'

it.each([
  [[], 'P1'],
  [['P1', 'P3'], 'P4'],
  [['P9', 'P10'], 'P11'],
  [['B7', 'post', 'P2x', 'P-5', 'P1.5', 'P'], 'P1'],
  [['P007'], 'P8'],
])('after %j comes %s', (taken, next) => {
  expect(nextId(taken, 'P')).toBe(next)
})
