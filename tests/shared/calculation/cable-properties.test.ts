import { describe, expect, it } from 'vitest'
import {
  axialStiffness,
  metallicArea,
  strainAtTension,
  stretchAtTension,
  thermalTensionChange,
} from '@shared/calculation/cable-properties'
import { newtons, poundsForce } from '@shared/units/force'
import { inches, millimetres, toInches, toMillimetres } from '@shared/units/length'

describe('metallicArea', () => {
  // Areas of equal round wires, mm², as the check values have them.
  it.each([
    ['7x7', 0.125, 4.789],
    ['7x7', 0.15625, 7.484],
    ['7x7', 0.1875, 10.78],
    ['1x19', 0.125, 6.017],
    ['1x19', 0.15625, 9.402],
    ['1x19', 0.1875, 13.54],
    ['7x19', 0.125, 4.68],
    ['7x19', 0.15625, 7.313],
    ['7x19', 0.1875, 10.53],
  ] as const)('of %s %d in is %d mm²', (construction, diameter, expected) => {
    const area = metallicArea({ construction, diameter: inches(diameter) })
    expect(Math.abs(area / expected - 1)).toBeLessThan(5e-4)
  })

  it.each([
    ['1x19', 19 / 25],
    ['7x7', 49 / 81],
    ['7x19', 133 / 225],
  ] as const)('of %s is its share of the circle', (construction, share) => {
    expect(metallicArea({ construction, diameter: millimetres(2) })).toBeCloseTo(share * Math.PI, 12)
  })
})

describe('axialStiffness', () => {
  it('of 1/8 in 7x7 is 431 kN', () => {
    expect(axialStiffness({ construction: '7x7', diameter: inches(0.125) }) / 1000).toBeCloseTo(431, 0)
  })

  it('of 1x19 starts from 130 GPa, and from another modulus where one is given', () => {
    const strand = { construction: '1x19', diameter: inches(0.125) } as const
    expect(axialStiffness(strand) / metallicArea(strand)).toBeCloseTo(130_000, 6)
    expect(axialStiffness(strand, 125_000) / metallicArea(strand)).toBeCloseTo(125_000, 6)
  })
})

describe('thermalTensionChange', () => {
  it('of 1/8 in 7x7 (431 kN) over 30 K is 207 N', () => {
    // 431 kN · 16·10⁻⁶ · 30 = 431 kN · 4.80·10⁻⁴ = 206.9 N
    expect(thermalTensionChange(newtons(431_000), 30)).toBeCloseTo(206.88, 6)
    expect(thermalTensionChange(newtons(431_000), -30)).toBeCloseTo(-206.88, 6)
  })
})

describe('stretchAtTension', () => {
  const elastic = (stiffness: number, tension: number) =>
    strainAtTension({ axialStiffness: newtons(stiffness), settlingStretch: 0 }, tension)

  it('is W·L / (A·E) where nothing settles', () => {
    // Steel wire 25.0 m, 2.03·10⁻³ m², 3.50·10³ kg, 20.0·10¹⁰ Pa, g 9.80: 2.112 mm (Serway, College Physics, ch. 9)
    const wire = stretchAtTension(millimetres(25_000), elastic(2.03e-3 * 20e10, 3500 * 9.8))
    expect(toMillimetres(wire)).toBeCloseTo(2.112, 3)
    // Cable 9.1 m, radius 5 mm, 800 N, 2·10¹¹ Pa: 0.4635 mm
    const cable = stretchAtTension(millimetres(9100), elastic(Math.PI * 0.005 ** 2 * 2e11, 800))
    expect(toMillimetres(cable)).toBeCloseTo(0.4635, 4)
  })

  it('adds the settling of the wires', () => {
    // 94.0895833 · (150/151000 + 0.00125) = 94.0895833 · 0.0022433775 = 0.2110784
    const strain = strainAtTension(
      { axialStiffness: poundsForce(151_000), settlingStretch: 0.00125 },
      poundsForce(150),
    )
    expect(toInches(stretchAtTension(94.0895833 * 25.4e6, strain))).toBeCloseTo(0.2110784, 6)
  })
})
