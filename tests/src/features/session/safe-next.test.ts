import { expect, it } from 'vitest'
import { safeNext } from '../../../../src/features/session/safe-next'

it('goes on to a page of ours with everything its address says', () => {
  expect(safeNext('/jobs/7?stage=check#surveys')).toBe('/jobs/7?stage=check#surveys')
})

it.each([
  'https://elsewhere.example/',
  '//elsewhere.example/',
  '/\\elsewhere.example/',
  '/\t/elsewhere.example/',
  '/.//elsewhere.example/',
  '/jobs/..//elsewhere.example/',
  'javascript:alert(1)',
  'jobs',
  '//',
])('never leaves for another machine: %j', (next) => {
  expect(safeNext(next)).toBe('/jobs')
})

it.each(['/sign-in', '/sign-in?next=%2Fsign-in', '/register', '/invite/abc'])(
  'does not come back to a page for people who are not signed in: %s',
  (next) => expect(safeNext(next)).toBe('/jobs'),
)

it('goes to the jobs when nothing was asked for', () => {
  expect(safeNext(null)).toBe('/jobs')
  expect(safeNext('')).toBe('/jobs')
})
