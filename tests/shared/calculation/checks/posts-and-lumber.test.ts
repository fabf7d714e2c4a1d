import { describe, expect, it } from 'vitest'
import {
  cantileverDeflection,
  cantileverMoment,
  deflectionAt,
  proppedDeflection,
  proppedMoment,
} from '@shared/calculation/checks/beam'
import { allowableBending, rectangleSection } from '@shared/calculation/checks/wood-section'
import { startingLumber } from '@shared/schemas/lumber'
import { NEWTONS_PER_POUND_FORCE, poundsForce } from '@shared/units/force'
import { psi, toPsi } from '@shared/units/stress'

// Every figure of *Posts and lumber* in the check values: dressed sizes of PS 20, beam formulas of the AISC Manual,
// reference design values of the NDS Supplement; the answers were computed and cross-checked with a symbolic solver.
const MM = 25.4
const lbfIn = (value: number) => value / NEWTONS_PER_POUND_FORCE / MM
const fourByFour = rectangleSection(3.5 * MM, 3.5 * MM)
const loads = {
  force: poundsForce(200),
  heights: Array.from({ length: 11 }, (_, i) => 3 * (i + 1) * MM),
}
const beam = { height: 36 * MM, stiffness: psi(1.4e6) * fourByFour.inertia }

describe('sections', () => {
  it('of a 4x4: I 12.505208 in⁴, S 7.145833 in³', () => {
    expect(fourByFour.inertia / MM ** 4).toBeCloseTo(12.505208, 6)
    expect(fourByFour.modulus / MM ** 3).toBeCloseTo(7.145833, 6)
  })
  it('of a 6x6: I 76.25521 in⁴, S 27.72917 in³', () => {
    const sixBySix = rectangleSection(5.5 * MM, 5.5 * MM)
    expect(sixBySix.inertia / MM ** 4).toBeCloseTo(76.25521, 5)
    expect(sixBySix.modulus / MM ** 3).toBeCloseTo(27.72917, 5)
  })
  it('bend about the right axis: twice as long along the pull is four times as strong, eight times as stiff', () => {
    const [long, wide] = [rectangleSection(2, 1), rectangleSection(1, 2)]
    expect([long.modulus / wide.modulus, long.inertia / wide.inertia]).toEqual([2, 4])
  })
})

describe('eleven loads of 200 lbf at 3 … 33 in on a 4x4, 36 in high', () => {
  it('standing free: 39 600 lbf·in, 5541.69 psi, tip 0.712503 in', () => {
    const moment = cantileverMoment(loads)
    expect(lbfIn(moment)).toBeCloseTo(39_600, 6)
    expect(toPsi(moment / fourByFour.modulus)).toBeCloseTo(5541.69, 2)
    const tip = deflectionAt(beam.height, loads, (x, a) => cantileverDeflection(beam, x, a))
    expect(tip / MM).toBeCloseTo(0.712503, 6)
  })
  it('held by the top rail: 10 800 lbf·in, 1511.37 psi, 0.0828169 in at mid-height', () => {
    const moment = proppedMoment(loads, beam.height)
    expect(lbfIn(moment)).toBeCloseTo(10_800, 6)
    expect(toPsi(moment / fourByFour.modulus)).toBeCloseTo(1511.37, 2)
    const middle = deflectionAt(beam.height / 2, loads, (x, a) => proppedDeflection(beam, x, a))
    expect(middle / MM).toBeCloseTo(0.0828169, 7)
  })
})

describe('one load of 200 lbf at 36 in', () => {
  it('bends a free 4x4 by 7200 lbf·in, 1007.58 psi, 0.177663 in', () => {
    const one = { force: poundsForce(200), heights: [36 * MM] }
    const moment = cantileverMoment(one)
    expect(lbfIn(moment)).toBeCloseTo(7200, 6)
    expect(toPsi(moment / fourByFour.modulus)).toBeCloseTo(1007.58, 2)
    expect((one.force * cantileverDeflection(beam, beam.height, beam.height)) / MM).toBeCloseTo(0.177663, 6)
  })
})

describe('the beam formulas', () => {
  const places = [0.1, 3, 11.7, 18, 29.9, 35.9].map((inch) => inch * MM)
  it('are alike either way round (Maxwell: what a load at a moves at x, the load at x moves at a)', () => {
    for (const x of places)
      for (const a of places) {
        expect(cantileverDeflection(beam, x, a)).toBeCloseTo(cantileverDeflection(beam, a, x), 15)
        expect(proppedDeflection(beam, x, a)).toBeCloseTo(proppedDeflection(beam, a, x), 15)
      }
  })
  it('give P L³ / 48 EI at mid-span of a simple beam, and nothing at its ends (AISC tables)', () => {
    const { height, stiffness } = beam
    expect(proppedDeflection(beam, height / 2, height / 2)).toBeCloseTo(height ** 3 / (48 * stiffness), 15)
    expect(proppedDeflection(beam, 0, height / 3)).toBeCloseTo(0, 15)
    expect(proppedDeflection(beam, height, height / 3)).toBeCloseTo(0, 15)
  })
})

describe('starting lumber (NDS Supplement)', () => {
  // Name, Fb psi, size factor, E psi, then what is allowed outdoors: wet service 0.85 only when Fb · C_F > 1150.
  it.each([
    ['Southern Pine No. 2', 1100, 1, 1.4e6, 1100],
    ['Douglas Fir-Larch No. 2', 900, 1.5, 1.6e6, 1147.5],
    ['Hem-Fir No. 2', 850, 1.5, 1.3e6, 1083.75],
  ])('%s', (name, bending, factor, modulus, allowed) => {
    const lumber = startingLumber().find((each) => each.name === name)!
    expect(toPsi(lumber.bending)).toBeCloseTo(bending, 9)
    expect(lumber.sizeFactor).toBe(factor)
    expect(toPsi(lumber.modulus)).toBeCloseTo(modulus, 4)
    expect(toPsi(allowableBending(lumber, { wetService: true }).stress)).toBeCloseTo(allowed, 9)
    expect(toPsi(allowableBending(lumber, { wetService: false }).stress)).toBeCloseTo(bending * factor, 9)
  })
  it('takes the wet factor just above 1150 psi and not at it', () => {
    const of = (bending: number) => ({
      id: 'x',
      name: 'x',
      bending: psi(bending),
      sizeFactor: 1,
      modulus: psi(1e6),
    })
    expect(allowableBending(of(1150), { wetService: true }).wetFactor).toBe(1)
    expect(allowableBending(of(1150.01), { wetService: true }).wetFactor).toBe(0.85)
  })
})
