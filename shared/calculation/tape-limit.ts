import type { HouseRules } from '../schemas/house-rules'
import { NM_PER_METRE, NM_PER_MILLIMETRE } from '../units/length'
import { withoutNoise } from './round-to-step'

const classes = {
  I: { a: 0.1, b: 0.1 },
  II: { a: 0.3, b: 0.2 },
  III: { a: 0.6, b: 0.4 },
} as const

/**
 * The limit of error of a tape over a length.
 *
 * Formula: `a + b · ⌈L in metres⌉` mm; class I 0.1 and 0.1, II 0.3 and 0.2, III 0.6 and 0.4; none without a class.
 * Units: nm in, nm out.
 * Source: Directive 2014/32/EU, Annex X, chapter I.
 *
 * @example 7.3 m of a class II tape: 0.3 + 0.2 · 8 = 1.9 mm
 */
export function tapeLimit(length: number, tapeClass: HouseRules['tapeClass']): number {
  if (!tapeClass) return 0
  const { a, b } = classes[tapeClass]
  const metres = Math.ceil(withoutNoise(length) / NM_PER_METRE)
  return (a + b * metres) * NM_PER_MILLIMETRE
}
