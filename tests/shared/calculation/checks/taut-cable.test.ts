import { describe, expect, it } from 'vitest'
import { infillLoad } from '@shared/calculation/checks/infill-load'
import { forcePushed, tensionPushed, type TautCable } from '@shared/calculation/checks/taut-cable'
import { poundsForce } from '@shared/units/force'
import { inches, millimetres, toMillimetres } from '@shared/units/length'

/** Check values, *A taut cable pushed at mid-span, rigid ends*: L mm, T0 N, EA N, P N, δ mm, T N. */
const vectors = [
  [1000, 1000, 500_000, 100, 18.586152, 1346.0164],
  [914.4, 889.6443, 600_000, 222.4111, 26.659848, 1910.3462],
  [1219.2, 889.6443, 600_000, 222.4111, 35.546463, 1910.3462],
  [1524.0, 1334.4665, 600_000, 222.4111, 39.566437, 2144.5646],
] as const

/** With rigid ends the cable that stretches is the span itself. */
const rigid = (span: number, tension: number, axialStiffness: number): TautCable => ({
  span: millimetres(span),
  tension,
  axialStiffness,
  length: millimetres(span),
})

describe('a taut cable pushed at mid-span', () => {
  // The exact form takes the strain from the unstretched length L / (1 + T0 / EA). Written out it is the specification's
  // with EA + T0 in the place of EA, which makes the published vectors an exact check of it.
  it.each(vectors)(
    'L %d mm, T %d N, EA %d N, P %d N',
    (span, tension, stiffness, push, deflection, pulled) => {
      const cable = rigid(span, tension, stiffness + tension)
      expect(forcePushed(cable, millimetres(deflection))).toBeCloseTo(push, 3)
      expect(tensionPushed(cable, millimetres(deflection))).toBeCloseTo(pulled, 2)
      const load = { value: push, side: inches(12) }
      const answer = infillLoad(cable, load, inches(12))
      expect(toMillimetres(answer.deflection)).toBeCloseTo(deflection, 5)
      expect(answer.tension).toBeCloseTo(pulled, 3)
    },
  )

  it.each(vectors)(
    'agrees to the strain T / EA as it stands: L %d',
    (span, tension, stiffness, push, deflection) => {
      const found = forcePushed(rigid(span, tension, stiffness), millimetres(deflection))
      expect(Math.abs(found / push - 1)).toBeLessThan(tension / stiffness)
    },
  )

  it('follows P ≈ 4 T δ / L + 8 EA (δ / L)³ while δ is small (check values, standard mechanics)', () => {
    const [span, tension, stiffness, deflection] = [1000, 1000, 500_000, 5]
    const small = (4 * tension * deflection) / span + 8 * stiffness * (deflection / span) ** 3
    const found = forcePushed(rigid(span, tension, stiffness), millimetres(deflection))
    expect(Math.abs(found / small - 1)).toBeLessThan(1e-3)
  })

  it('holds 70 kg, 1.5 m down in 460 m, with 5.25·10⁴ N (Young & Freedman 5.3)', () => {
    // T = P l / (2 δ): without stiffness the force is proportional to the tension. The book prints three figures.
    const force = forcePushed(rigid(460_000, 1, 0), millimetres(1500))
    expect(Math.abs((70 * 9.8) / force / 5.25e4 - 1)).toBeLessThan(0.002)
  })

  it('holds 90.0 kg at 10.0° with 2.54·10³ N (Young & Freedman 5.3)', () => {
    const half = 1000
    const down = half * Math.tan((10 * Math.PI) / 180)
    const force = forcePushed(rigid(2 * half, 1, 0), millimetres(down))
    expect((90 * 9.8) / force / 1000).toBeCloseTo(2.54, 2)
  })

  it('may neglect its own weight: 1/8 in cable over 48 in at 200 lbf sags 0.1 mm (check values)', () => {
    // A load of half the weight at mid-span deflects a string as its weight does: P L / 4 T = w L² / 8 T.
    const weight = 0.0485 * 9.81 * 1.2192
    const cable = rigid(1219.2, poundsForce(200), 431_000)
    const { deflection } = infillLoad(cable, { value: weight / 2, side: inches(12) }, inches(12))
    expect(toMillimetres(deflection)).toBeCloseTo(0.1, 2)
  })
})

describe('infillLoad', () => {
  it('puts 50 lbf on a square foot as 12.5 lbf on a cable of 3 in pitch (IRC Table R301.5)', () => {
    const cable = rigid(1219.2, poundsForce(150), 431_000)
    const { load, deflection, tension } = infillLoad(
      cable,
      { value: poundsForce(50), side: inches(12) },
      inches(3),
    )
    expect(load).toBeCloseTo(poundsForce(12.5), 9)
    expect(forcePushed(cable, deflection)).toBeCloseTo(load, 9)
    expect(tensionPushed(cable, deflection)).toBe(tension)
  })
})
