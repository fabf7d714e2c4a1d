import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { pushThrough } from '@shared/calculation/checks/push-through'
import { forcePushed, type TautCable } from '@shared/calculation/checks/taut-cable'
import { millimetres } from '@shared/units/length'

const mm = (value: number) => millimetres(value)
const cable = (more: Partial<TautCable> = {}): TautCable => ({
  span: mm(1200),
  tension: 700,
  axialStiffness: 450_000,
  length: mm(3000),
  ...more,
})
const between = (more: Partial<Parameters<typeof pushThrough>[1]> = {}) => ({
  pitch: mm(76.2),
  diameter: mm(4),
  sphere: mm(101.6),
  ...more,
})
/** Sphere, pitch between half and nearly all of what still touches, tension, span. */
const anyCase = fc.record({
  sphere: fc.double({ min: 80, max: 150, noNaN: true }),
  share: fc.double({ min: 0.3, max: 0.99, noNaN: true }),
  tension: fc.double({ min: 50, max: 5000, noNaN: true }),
  span: fc.double({ min: 300, max: 3000, noNaN: true }),
})
const asCase = ({
  sphere,
  share,
  tension,
  span,
}: {
  sphere: number
  share: number
  tension: number
  span: number
}) => ({
  cable: cable({ tension, span: mm(span), length: mm(span * 2) }),
  between: between({ sphere: mm(sphere), pitch: mm((sphere + 4) * share) }),
})

describe('pushThrough', () => {
  it('has its greatest push at ρ³ = rc pitch² / 4 when EA is nothing and deflections are small', () => {
    // Closed form (section 8): P(X) = 2 · 2 T x / half · X / ρ; with half taken as a, P ∝ (rc − ρ) √(ρ² − p²) / ρ with
    // p = pitch / 2, greatest where ρ³ = rc p². A long span makes half = a true to 10⁻⁷.
    const slack = cable({ axialStiffness: 0, span: mm(100_000) })
    const { pitch, diameter, sphere } = between()
    const rc = (sphere + diameter) / 2
    const rho = Math.cbrt((rc * pitch * pitch) / 4)
    const x = Math.sqrt(rho * rho - (pitch * pitch) / 4)
    const closed = (2 * ((2 * slack.tension * (rc - rho)) / (slack.span / 2)) * x) / rho
    expect(pushThrough(slack, between()) / closed).toBeCloseTo(1, 6)
  })

  it('is no less than the push at any place, and reached at one of them', () => {
    fc.assert(
      fc.property(anyCase, (given) => {
        const { cable: taut, between: gap } = asCase(given)
        const rc = (gap.sphere + gap.diameter) / 2
        const last = Math.sqrt(rc * rc - (gap.pitch / 2) ** 2)
        let greatest = 0
        for (let i = 1; i < 4000; i += 1) {
          const x = (last * i) / 4000
          const rho = Math.hypot(x, gap.pitch / 2)
          greatest = Math.max(greatest, (2 * forcePushed(taut, rc - rho) * x) / rho)
        }
        const found = pushThrough(taut, gap)
        expect(found).toBeGreaterThanOrEqual(greatest * (1 - 1e-12))
        expect(found / greatest).toBeLessThan(1.0001)
      }),
      { numRuns: 60 },
    )
  })

  it('rises with the tension and falls with the span', () => {
    fc.assert(
      fc.property(anyCase, fc.double({ min: 1.01, max: 3, noNaN: true }), (given, times) => {
        const { cable: taut, between: gap } = asCase(given)
        const push = pushThrough(taut, gap)
        expect(pushThrough({ ...taut, tension: taut.tension * times }, gap)).toBeGreaterThan(push)
        expect(pushThrough({ ...taut, span: taut.span * times }, gap)).toBeLessThan(push)
      }),
      { numRuns: 200 },
    )
  })

  it('is nothing when the sphere passes without touching: exactly at, and one step to either side', () => {
    const touching = mm(101.6 + 4)
    expect(pushThrough(cable(), between({ pitch: touching }))).toBe(0)
    expect(pushThrough(cable(), between({ pitch: touching + 1 }))).toBe(0)
    expect(pushThrough(cable(), between({ pitch: touching - 1000 }))).toBeGreaterThan(0)
  })
})
