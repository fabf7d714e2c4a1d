import { describe, expect, it, vi } from 'vitest'
import { inches } from '@shared/units/length'
import { lengthCommit } from '../../../../../src/features/survey-editor/table/length-commit'

const view = { units: { length: 'in', force: 'lbf' } } as const

describe('lengthCommit', () => {
  it('hands on what was understood, and nothing for an emptied cell', () => {
    const keep = vi.fn()
    expect(lengthCommit(view, keep)('46 1/2')).toBeUndefined()
    expect(lengthCommit(view, keep)('')).toBeUndefined()
    expect(keep.mock.calls).toEqual([[inches(46.5)], [undefined]])
  })

  it('keeps zero and what is no length back, with a sentence', () => {
    const keep = vi.fn()
    expect(lengthCommit(view, keep)('0')).toMatch(/zero cannot be kept/)
    expect(lengthCommit(view, keep)('abc')).toBeTruthy()
    expect(keep).not.toHaveBeenCalled()
  })

  it('takes zero where a cell may hold it', () => {
    const keep = vi.fn()
    expect(lengthCommit(view, keep, 'zero')('0')).toBeUndefined()
    expect(keep).toHaveBeenCalledWith(inches(0))
  })
})
