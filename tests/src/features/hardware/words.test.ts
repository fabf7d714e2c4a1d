import { expect, it } from 'vitest'
import { newtons, poundsForce } from '@shared/units/force'
import { forceText } from '../../../../src/features/hardware/words'

it('sets thousands of a force apart', () => {
  expect(forceText(poundsForce(151_000), 'lbf')).toBe('151\u202f000 lbf')
  expect(forceText(newtons(1_234_567), 'N')).toBe('1\u202f234\u202f567 N')
  expect(forceText(poundsForce(150), 'lbf')).toBe('150 lbf')
})
