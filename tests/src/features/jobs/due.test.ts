import { expect, it } from 'vitest'
import { daysUntil, dueWords } from '../../../../src/features/jobs/due'

const lateInTheDay = new Date(2026, 4, 4, 23, 30)

it.each([
  ['2026-05-04', 'due today'],
  ['2026-05-05', 'due in 1 day'],
  ['2026-05-18', 'due in 14 days'],
  ['2026-05-03', '1 day late'],
  ['2026-04-20', '14 days late'],
])('says %s on 4 May as "%s"', (due, words) => {
  expect(dueWords(due, lateInTheDay)).toBe(words)
})

it('counts days by the calendar, across months, leap days and the turn of the clocks', () => {
  expect(daysUntil('2028-03-01', new Date(2028, 1, 28, 0, 5))).toBe(2)
  expect(daysUntil('2027-03-01', new Date(2027, 1, 28, 0, 5))).toBe(1)
  expect(daysUntil('2026-11-02', new Date(2026, 9, 24, 12))).toBe(9)
})
