import { expect, it } from 'vitest'
import { toPoundsForce } from '@shared/units/force'
import { inches, millimetres } from '@shared/units/length'
import { offeredStiffness } from '../../../../src/features/hardware/offered-stiffness'

it('offers 151 000 lbf for 5/32 in 7x7', () => {
  // 49 · π/4 · (3.96875/9)² = 7.4835 mm², times 90 000 N/mm² is 673 518 N or 151 413 lbf.
  const offered = offeredStiffness({ construction: '7x7', diameter: inches(5 / 32) }, 'lbf')
  expect(toPoundsForce(offered)).toBeCloseTo(151_000, 6)
})

it('offers three figures of newtons in a metric house', () => {
  // 19 · π/4 · (4/5)² = 9.5504 mm², times 130 000 N/mm² is 1 241 557 N.
  expect(offeredStiffness({ construction: '1x19', diameter: millimetres(4) }, 'N')).toBe(1_240_000)
})
