import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { formatLength, lengthText, writeLength } from '@shared/units/format-length'
import { inches, millimetres } from '@shared/units/length'

describe('a length taken apart', () => {
  it('gives feet, inches and a fraction in lowest terms', () => {
    expect(formatLength(inches(148.375), { style: 'feet' })).toEqual({
      negative: false,
      approximate: false,
      system: 'inch',
      feet: 12,
      inches: 4,
      fraction: { numerator: 3, denominator: 8 },
    })
  })

  it('leaves out feet below one foot, and inches where a fraction stands alone', () => {
    expect(formatLength(inches(0.375), { style: 'feet' })).toEqual({
      negative: false,
      approximate: false,
      system: 'inch',
      fraction: { numerator: 3, denominator: 8 },
    })
  })

  it('gives millimetres to a tenth', () => {
    expect(formatLength(millimetres(3770.26), { style: 'millimetres' })).toEqual({
      negative: false,
      approximate: true,
      system: 'metric',
      millimetres: '3770.3',
    })
  })
})

describe('plain text', () => {
  it.each([
    [148.375, 'feet', `12' 4 3/8"`],
    [144, 'feet', `12' 0"`],
    [144.5, 'feet', `12' 0 1/2"`],
    [11.984375, 'feet', `11 63/64"`],
    [148.375, 'inches', `148 3/8"`],
    [0.015625, 'inches', `1/64"`],
    [0, 'feet', `0"`],
    [-1.5, 'inches', `−1 1/2"`],
  ] as const)('%d in as %s is %s', (value, style, text) => {
    expect(writeLength(inches(value), { style })).toBe(text)
  })

  it.each([
    [3770, '3770 mm'],
    [0.1, '0.1 mm'],
    [1234.5, '1234.5 mm'],
    [-6.4, '−6.4 mm'],
  ])('%d mm is %s', (value, text) => {
    expect(writeLength(millimetres(value), { style: 'millimetres' })).toBe(text)
  })
})

describe('rounding', () => {
  // NIST Handbook 44: a reading midway between two graduations goes to the even one.
  it.each([
    [1 / 32, 16, `≈ 0"`],
    [3 / 32, 16, `≈ 1/8"`],
    [5 / 32, 16, `≈ 1/8"`],
    [1 / 64, 32, `≈ 0"`],
    [3 / 64, 32, `≈ 1/16"`],
    [0.04, 16, `≈ 1/16"`],
    [11.99, 16, `≈ 12"`],
    [1 / 32, 32, `1/32"`],
  ] as const)('%d in to 1/%d is %s', (value, finest, text) => {
    expect(writeLength(inches(value), { style: 'inches', finest })).toBe(text)
  })

  it.each([
    [0.05, '≈ 0 mm'],
    [0.15, '≈ 0.2 mm'],
    [0.25, '≈ 0.2 mm'],
    [0.26, '≈ 0.3 mm'],
  ])('%d mm is %s', (value, text) => {
    expect(writeLength(millimetres(value), { style: 'millimetres' })).toBe(text)
  })

  it('carries a fraction that rounds up into inches and feet', () => {
    expect(writeLength(inches(11.999), { style: 'feet', finest: 64 })).toBe(`≈ 1' 0"`)
  })

  it('flags a length one nanometre off, and not the noise of a calculation', () => {
    expect(formatLength(inches(1) + 1, { style: 'inches' }).approximate).toBe(true)
    expect(formatLength(inches(1) + 0.001, { style: 'inches' }).approximate).toBe(false)
  })

  it('is never further off than half a step, on either side of zero', () => {
    const formats = fc.constantFrom(
      ...([16, 32, 64] as const).map((finest) => ({ style: 'feet' as const, finest })),
    )
    fc.assert(
      fc.property(fc.integer({ min: -1e11, max: 1e11 }), formats, (nm, format) => {
        const parts = formatLength(nm, format)
        if (parts.system !== 'inch') return false
        const { feet = 0, inches: whole = 0, fraction = { numerator: 0, denominator: 1 } } = parts
        const size = (feet * 12 + whole + fraction.numerator / fraction.denominator) * 25_400_000
        const shown = parts.negative ? -size : size
        return Math.abs(shown - nm) <= 25_400_000 / format.finest / 2 && (shown === nm) === !parts.approximate
      }),
    )
  })

  it('refuses what is no length', () => {
    expect(() => formatLength(Number.NaN, { style: 'feet' })).toThrow(RangeError)
    expect(() => formatLength(Infinity, { style: 'millimetres' })).toThrow(RangeError)
  })

  it('writes the sign after the mark of rounding', () => {
    expect(lengthText(formatLength(-1 * inches(0.51), { style: 'inches', finest: 16 }))).toBe(`≈ −1/2"`)
  })
})
