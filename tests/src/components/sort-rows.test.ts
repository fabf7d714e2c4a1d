import { expect, test } from 'vitest'
import { nextSort, sortRows } from '@/components/sort-rows'

const values = (rows: readonly { v?: string | number | null }[]) => rows.map(({ v }) => v)
const rows = [{ v: 10 }, { v: undefined }, { v: 9 }, { v: null }, { v: 100 }]

test('numbers sort as numbers, and what has no value is last either way', () => {
  expect(values(sortRows(rows, ({ v }) => v, false))).toEqual([9, 10, 100, undefined, null])
  expect(values(sortRows(rows, ({ v }) => v, true))).toEqual([100, 10, 9, undefined, null])
})

test('figures inside words count as figures', () => {
  const posts = [{ v: 'P10' }, { v: 'P2' }, { v: 'p1' }]
  expect(values(sortRows(posts, ({ v }) => v, false))).toEqual(['p1', 'P2', 'P10'])
})

test('zero is a value and an empty word is none', () => {
  expect(values(sortRows([{ v: '' }, { v: 0 }], ({ v }) => v, false))).toEqual([0, ''])
})

test('equal rows keep their order, up and down, and the rows themselves stay as they were', () => {
  const equal = [
    { v: 1, name: 'a' },
    { v: 1, name: 'b' },
    { v: 0, name: 'c' },
  ]
  expect(sortRows(equal, ({ v }) => v, false).map(({ name }) => name)).toEqual(['c', 'a', 'b'])
  expect(sortRows(equal, ({ v }) => v, true).map(({ name }) => name)).toEqual(['a', 'b', 'c'])
  expect(equal.map(({ name }) => name)).toEqual(['a', 'b', 'c'])
})

test('a header sorts up, then down, then not at all; another header begins anew', () => {
  const up = nextSort(undefined, 'cut')
  const down = nextSort(up, 'cut')
  expect([up, down, nextSort(down, 'cut')]).toEqual([
    { key: 'cut', down: false },
    { key: 'cut', down: true },
    undefined,
  ])
  expect(nextSort(down, 'path')).toEqual({ key: 'path', down: false })
})
