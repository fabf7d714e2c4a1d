import { describe, expect, it } from 'vitest'
import { starterRules } from '@shared/calculation/starter-rules'
import type { Reading } from '@shared/schemas/bay'
import { inches } from '@shared/units/length'
import { readingDoubts } from '../../../../../src/features/survey-editor/panels/reading-doubts'

const view = { rules: starterRules, units: { length: 'in', force: 'lbf' } } as const
const read = (at: 'top' | 'bottom', value: number, struck?: string): Reading => ({
  id: `${at}${value}`,
  at,
  value: inches(value),
  ...(struck === undefined ? {} : { struck }),
})

describe('readingDoubts', () => {
  it('is silent up to three reading limits and a quarter inch of lean, and speaks one step beyond', () => {
    expect(readingDoubts([read('top', 46), read('top', 46 + 3 / 16)], view)).toEqual([])
    expect(readingDoubts([read('top', 46), read('top', 46 + 1 / 4)], view)[0]).toContain('lie 1/4 in apart')
    expect(readingDoubts([read('top', 46.25), read('bottom', 46)], view)).toEqual([])
    expect(readingDoubts([read('top', 46.3125), read('bottom', 46)], view)[0]).toContain('Post out of plumb')
  })

  it('names a whole foot, and passes over what is struck', () => {
    expect(readingDoubts([read('top', 46), read('top', 58)], view)[1]).toContain('near a whole foot')
    expect(readingDoubts([read('top', 46), read('top', 57)], view)).toHaveLength(1)
    expect(readingDoubts([read('top', 46), read('top', 64, 'digits swapped')], view)).toEqual([])
  })
})
