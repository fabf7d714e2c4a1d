import { describe, expect, it } from 'vitest'
import { countPitches, exceeds, roundToStep, roundUpToStep } from '@shared/calculation/round-to-step'

const SIXTEENTH = 1_587_500
const INCH = 25_400_000

describe('roundUpToStep', () => {
  it('leaves a whole number of steps alone, and the noise of sums above it', () => {
    expect(roundUpToStep(48 * INCH, SIXTEENTH)).toBe(48 * INCH)
    expect(roundUpToStep(48 * INCH + 2e-4, SIXTEENTH)).toBe(48 * INCH)
  })

  it('takes the next step for anything more', () => {
    expect(roundUpToStep(48 * INCH + 1, SIXTEENTH)).toBe(48 * INCH + SIXTEENTH)
  })
})

describe('roundToStep', () => {
  it('rounds halves up, noise or not', () => {
    expect(roundToStep(INCH + SIXTEENTH / 2, SIXTEENTH)).toBe(INCH + SIXTEENTH)
    expect(roundToStep(INCH + SIXTEENTH / 2 - 2e-4, SIXTEENTH)).toBe(INCH + SIXTEENTH)
    expect(roundToStep(INCH + SIXTEENTH / 2 - 1, SIXTEENTH)).toBe(INCH)
  })

  it('takes steps of an odd number of nanometres', () => {
    expect(roundToStep(10, 3)).toBe(9)
    expect(roundToStep(10.5, 3)).toBe(12)
  })
})

describe('countPitches', () => {
  it('counts a whole number of pitches as that', () => {
    expect(countPitches(36 * INCH, 3 * INCH)).toBe(12)
    expect(countPitches(36 * INCH, 3 * INCH * (1 - 1e-16))).toBe(12)
  })

  it('rounds the rest up', () => {
    expect(countPitches(34.5 * INCH, 3 * INCH)).toBe(12)
    expect(countPitches(36 * INCH + 1, 3 * INCH)).toBe(13)
  })
})

describe('exceeds', () => {
  it('ignores noise but no nanometre', () => {
    expect(exceeds(100 + 5e-4, 100)).toBe(false)
    expect(exceeds(101, 100)).toBe(true)
  })
})
