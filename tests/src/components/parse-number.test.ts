import { expect, test } from 'vitest'
import { parseNumber } from '@/components/parse-number'

test.each([
  ['2.5', 2.5],
  [' 2,5 ', 2.5],
  ['.25', 0.25],
  ['150', 150],
  ['-3', -3],
  ['−3', -3],
  ['0,125', 0.125],
  ['12.', 12],
])('reads %j as %d', (text, value) => {
  expect(parseNumber(text)).toEqual({ ok: true, value })
})

test('nothing written is no number and no fault', () => {
  expect(parseNumber('   ')).toEqual({ ok: true, value: undefined })
})

test.each(['abc', '1e3', '1 000', '2.5.1', '0x10', 'Infinity', '-', '.', '5 lbf'])(
  'says that %j is not understood',
  (text) => {
    const parsed = parseNumber(text)
    expect(parsed.ok).toBe(false)
    expect(parsed).toHaveProperty('message', expect.stringContaining(`“${text}”`))
  },
)

test('asks which is meant where a comma may group or divide', () => {
  expect(parseNumber('1,500')).toEqual({
    ok: false,
    message: '“1,500” can be read two ways. Write 1500 or 1.500.',
  })
})

test('says which limit was passed, and takes the limits themselves', () => {
  expect(parseNumber('-1', { min: 0 })).toEqual({ ok: false, message: 'Write 0 or more.' })
  expect(parseNumber('101', { max: 100 })).toEqual({ ok: false, message: 'Write 100 or less.' })
  expect(parseNumber('0', { min: 0, max: 100 }).ok).toBe(true)
  expect(parseNumber('100', { min: 0, max: 100 }).ok).toBe(true)
})
