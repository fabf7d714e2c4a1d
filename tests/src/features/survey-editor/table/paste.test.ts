import { expect, it } from 'vitest'
import { inches } from '@shared/units/length'
import { readPasted } from '../../../../../src/features/survey-editor/table/paste'

it('reads a pasted column row by row, skips empty lines and keeps what it did not understand apart', () => {
  const lines = readPasted(['46 1/2', '', 'about 3', '48"', '50'], ['B1', 'B2', 'B3', 'B4'], 'in')
  expect(lines.map(({ row, length }) => [row, length])).toEqual([
    ['B1', inches(46.5)],
    ['B3', undefined],
    ['B4', inches(48)],
    ['', undefined],
  ])
  expect(lines[1]?.fault).toContain('about')
  expect(lines[3]?.fault).toContain('no row')
})
