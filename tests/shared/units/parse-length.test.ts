import fc from 'fast-check'
import { describe, expect, it, test } from 'vitest'
import { type LengthFormat, writeLength } from '@shared/units/format-length'
import { parseLength } from '@shared/units/parse-length'

const read = (text: string, house: 'in' | 'mm' = 'in') => parseLength(text, { default: house })

function lengthOf(text: string, house: 'in' | 'mm' = 'in'): number {
  const parsed = read(text, house)
  if (!parsed.ok) throw new Error(parsed.message)
  return parsed.length
}

function refusal(text: string, house: 'in' | 'mm' = 'in') {
  const parsed = read(text, house)
  if (parsed.ok) throw new Error(`${text} was understood as ${parsed.length} nm`)
  return parsed
}

/** 148 3/8 in: 9496 sixty-fourths of 396 875 nm. */
const TWELVE_FEET_FOUR_AND_THREE_EIGHTHS = 9496 * 396_875
const INCH = 25_400_000

describe('feet and inches', () => {
  it.each([
    `12' 4 3/8"`,
    `12'4 3/8"`,
    `12' 4-3/8"`,
    `12'-4 3/8"`,
    `12' - 4 3/8"`,
    `12'-4-3/8"`,
    `12′ 4 ⅜″`,
    `12’ 4⅜”`,
    `12' 4 3⁄8''`,
    `12' 4" 3/8`,
    `12-4-3/8`,
    `12-4 3/8`,
    `12–4–3/8`,
    '12 ft 4 3/8 in',
    '12ft 4.375in',
    '12 Ft. 4 3/8 IN.',
    '12 feet 4 3 / 8 inches',
    `12' 4³⁄₈"`,
    '148 3/8',
    '148-3/8',
    '148 ⅜',
    '148.375',
    '148,3750',
    '  148   3/8  ',
    '148\u00a03/8 in',
    `148.375"`,
  ])('reads %s as 148 3/8 in', (text) => {
    expect(lengthOf(text)).toBe(TWELVE_FEET_FOUR_AND_THREE_EIGHTHS)
  })

  it.each([
    [`4'`, 48],
    [`4 1/2'`, 54],
    [`4.5 ft`, 54],
    ['⅜', 0.375],
    ['3/8', 0.375],
    ['1 1⁄2', 1.5],
    ['.5', 0.5],
    ['0', 0],
    ['12-4', 148],
    [`12' 4`, 148],
    [`4' 3/8"`, 48.375],
    ['600', 600],
    [`720"`, 720],
    ['1,234.5 in', 1234.5],
  ])('reads %s as %d in', (text, inches) => {
    expect(lengthOf(text)).toBe(inches * INCH)
  })

  it('reads a third to the nearest nanometre', () => {
    // 25 400 000 / 3 = 8 466 666.67
    expect(lengthOf('1/3')).toBe(8_466_667)
  })
})

describe('metric', () => {
  it.each(['3770', '3770 mm', '3770mm', '377 cm', '3.77 m', '3,77 m', '3 m 77 cm', '3 m 770 mm', '3770,0'])(
    'reads %s as 3770 mm in a metric house',
    (text) => {
      expect(lengthOf(text, 'mm')).toBe(3_770_000_000)
    },
  )

  it('takes a bare number for the house’s unit, and a written unit over it', () => {
    expect(lengthOf('148.375', 'mm')).toBe(148_375_000)
    expect(lengthOf('148.375 mm', 'in')).toBe(148_375_000)
    expect(lengthOf('10"', 'mm')).toBe(10 * INCH)
    expect(lengthOf('12-4-3/8', 'mm')).toBe(TWELVE_FEET_FOUR_AND_THREE_EIGHTHS)
  })
})

describe('what is not understood', () => {
  it.each([
    ['', 'in', '', 'Nothing is written here'],
    ['   ', 'mm', '', '3770 or 3.77 m'],
    ['3770', 'in', '3770', 'would be inches, over 314 ft. Write 3770 mm or 3770"'],
    ['3,770', 'in', '3,770', 'could be 3770 or 3.770'],
    ['148 3/8', 'mm', '148 3/8', 'Write 148 3/8" if inches are meant'],
    ['12-4', 'mm', '4', 'Write one number and its unit'],
    ['-5', 'in', '-', 'cannot be below zero'],
    ['−5', 'mm', '−', 'cannot be below zero'],
    ['5 3/0', 'in', '3/0', 'divides by zero'],
    ['9/8', 'in', '9/8', 'Write 1 1/8'],
    ['1483/8', 'in', '1483/8', 'Write 185 3/8'],
    ['2 8/8', 'in', '8/8', 'Write 3 if that is meant'],
    ['148.5 3/8', 'in', '148.5 3/8', 'decimals and a fraction'],
    [`5' 14"`, 'in', '14"', 'not below one foot'],
    [`5' 12"`, 'in', '12"', 'not below one foot'],
    [`4.5' 3"`, 'in', '3"', 'already has a part'],
    ['3 m 120 cm', 'mm', '120 cm', 'not below one m'],
    ['3 m 4 in', 'mm', '4 in', 'does not go after'],
    [`4" 5'`, 'in', `5'`, 'does not go after'],
    ['3 m 770', 'mm', '770', 'has no unit'],
    ['148 3', 'in', '3', 'a fraction as 3/8'],
    ['12 4 3/8', 'in', '4 3/8', `12' 4 3/8"`],
    ['12-4-6', 'in', '6', 'after “4” was not understood'],
    ['148 - 3/8', 'in', '3/8', 'after “148” was not understood'],
    [`4" - 3/8"`, 'in', '3/8"', 'does not go after'],
    ['12 apples', 'in', 'apples', '“apples” was not understood'],
    ['1e5', 'in', 'e', '“e” was not understood'],
    ['about 3', 'mm', 'about', '“about” was not understood'],
    ['≈ 3"', 'in', '≈', '“≈” was not understood'],
    ['"', 'in', '"', 'no number before'],
    ['12-', 'in', '-', 'missing after “-”'],
    ['constructor', 'in', 'constructor', 'was not understood'],
    ['1001 m', 'mm', '1001 m', 'more than 1 km'],
  ] as const)('%j in a house of %s: %j', (text, house, part, message) => {
    const refused = refusal(text, house)
    expect(refused.part).toBe(part)
    expect(refused.message).toContain(message)
  })

  it('names a long part without repeating all of it', () => {
    expect(refusal('x'.repeat(5000)).message.length).toBeLessThan(120)
  })

  it(
    'never throws and gives whole nanometres of zero or more, whatever is written',
    { timeout: 60_000 },
    () => {
      const pieces = fc.constantFrom(
        ...`0123456789.,'"/-⁄⅜ ′″`,
        ' ft',
        ' in',
        ' mm',
        ' m',
        '3/8',
        '-',
        'x',
        '\n',
        '😀',
      )
      const text = fc.oneof(
        fc.string({ unit: 'binary', maxLength: 20 }),
        fc.array(pieces, { maxLength: 12 }).map((p) => p.join('')),
      )
      fc.assert(
        fc.property(text, fc.constantFrom('in' as const, 'mm' as const), (written, house) => {
          const parsed = read(written, house)
          if (parsed.ok) return Number.isSafeInteger(parsed.length) && parsed.length >= 0
          return parsed.message.endsWith('.') && written.includes(parsed.part.trim().slice(0, 1))
        }),
        { numRuns: 2000 },
      )
    },
  )
})

/** The first text of these that is not read back as what was written, by steps of `step` nm. */
function firstNotReadBack(count: number, step: number, format: LengthFormat): string | undefined {
  const house = { default: format.style === 'millimetres' ? 'mm' : 'in' } as const
  for (let steps = 0; steps <= count; steps += 1) {
    const text = writeLength(steps * step, format)
    const parsed = parseLength(text, house)
    if (!parsed.ok || parsed.length !== steps * step) return `${steps} steps: ${text}`
  }
  return undefined
}

const SIXTY_FOURTHS_IN_200_FEET = 200 * 12 * 64
const TENTHS_OF_A_MILLIMETRE_IN_60_METRES = 600_000

/** A million lengths: seconds on a busy machine. */
describe('what is written is read back exactly', { timeout: 60_000 }, () => {
  test('every 1/64 in up to 200 ft, in feet and inches', () => {
    expect(firstNotReadBack(SIXTY_FOURTHS_IN_200_FEET, 396_875, { style: 'feet' })).toBeUndefined()
  })
  test('every 1/64 in up to 200 ft, in inches', () => {
    expect(firstNotReadBack(SIXTY_FOURTHS_IN_200_FEET, 396_875, { style: 'inches' })).toBeUndefined()
  })
  test('every 0.1 mm up to 60 m', () => {
    expect(
      firstNotReadBack(TENTHS_OF_A_MILLIMETRE_IN_60_METRES, 100_000, { style: 'millimetres' }),
    ).toBeUndefined()
  })
  test('every 0.1 mm up to 60 m as a bare number', () => {
    for (let tenths = 0; tenths <= TENTHS_OF_A_MILLIMETRE_IN_60_METRES; tenths += 7) {
      const parsed = parseLength(String(tenths / 10), { default: 'mm' })
      if (!parsed.ok || parsed.length !== tenths * 100_000) expect.fail(`${tenths / 10} was not read back`)
    }
  })
})
