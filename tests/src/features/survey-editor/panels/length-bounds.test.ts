import { describe, expect, it } from 'vitest'
import { inches } from '@shared/units/length'
import { lengthFault } from '../../../../../src/features/survey-editor/panels/length-bounds'

describe('lengthFault', () => {
  it('lets a length through, and zero only where a field may hold it', () => {
    expect(lengthFault(inches(46.5))).toBeUndefined()
    expect(lengthFault(inches(0))).toMatch(/zero cannot be kept/)
    expect(lengthFault(inches(0), 'zero')).toBeUndefined()
  })

  it('refuses what is below zero everywhere', () => {
    expect(lengthFault(inches(-1))).toMatch(/below zero/)
    expect(lengthFault(inches(-1), 'zero')).toMatch(/below zero/)
  })
})
