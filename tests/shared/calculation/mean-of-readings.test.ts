import { describe, expect, it } from 'vitest'
import { meanOfReadings } from '@shared/calculation/mean-of-readings'
import type { Reading } from '@shared/schemas/bay'
import { inches } from '@shared/units/length'

const reading = (id: string, at: Reading['at'], value: number, struck?: string): Reading => ({
  id,
  at,
  value: inches(value),
  struck,
})

describe('meanOfReadings', () => {
  const readings = [
    reading('r1', 'top', 46.5),
    reading('r2', 'top', 64, 'digits swapped'),
    reading('r3', 'top', 46.625),
    reading('r4', 'bottom', 46.25),
  ]

  it('is the mean of what counts at the place', () => {
    // (46.5 + 46.625) / 2 = 46.5625
    expect(meanOfReadings(readings, 'top')).toEqual({
      mean: inches(46.5625),
      count: 2,
      least: inches(46.5),
      greatest: inches(46.625),
    })
    expect(meanOfReadings(readings, 'bottom')?.count).toBe(1)
  })

  it('is nothing where every reading is struck', () => {
    expect(meanOfReadings([reading('r1', 'top', 46.5, 'wrong bay')], 'top')).toBeUndefined()
  })

  it('is not rounded', () => {
    const odd = [
      reading('a', 'top', 1),
      reading('b', 'top', 1),
      { ...reading('c', 'top', 1), value: (inches(1) + 1) as Reading['value'] },
    ]
    expect(meanOfReadings(odd, 'top')?.mean).toBeCloseTo(25_400_000 + 1 / 3, 6)
  })
})
