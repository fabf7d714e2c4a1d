import { type Length, NM_PER_FOOT, NM_PER_INCH, nanometres } from './length'
import { NotUnderstood, type Quantity, quote, readQuantities } from './length-quantities'
import type { LengthUnit } from './length-tokens'

export type ParsedLength =
  | { ok: true; length: Length }
  /** One sentence for people, and the part of the text that was not understood. */
  | { ok: false; message: string; part: string }

/** Bare inches above this are asked about: 50 ft is past any tape reading, and 600 to 6000 is what millimetres look like. */
const MOST_BARE_INCHES = 600
const LONGEST = 1e12

const NM: Record<LengthUnit, number> = {
  ft: NM_PER_FOOT,
  in: NM_PER_INCH,
  m: 1e9,
  cm: 1e7,
  mm: 1e6,
}

/**
 * Reads a length as people write it: `12' 4 3/8"`, `12-4-3/8`, `148 3/8`, `148.375`, `3.77 m`, `3770`, `⅜`.
 *
 * A bare number is inches in an inch house and millimetres in a metric one; above 600 bare inches it asks for a unit,
 * because it would be millimetres typed into the wrong house. `12-4` is feet and inches in an inch house. A comma is a decimal
 * comma unless exactly three digits follow a whole number, which might be a thousand: then it asks. After feet, inches
 * are below 12; a fraction is below one. Zero is a length; less is not.
 *
 * @returns the length, rounded to the nearest nanometre, or one sentence that says what was not understood and what would be
 * @example parseLength('12-4-3/8', { default: 'in' }) is 148 3/8 in
 */
export function parseLength(text: string, house: { default: 'in' | 'mm' }): ParsedLength {
  try {
    const nm = total(readQuantities(text, house.default), house.default)
    if (nm > LONGEST)
      throw new NotUnderstood(text.trim(), `${quote(text.trim())} is more than 1 km; check it.`)
    return { ok: true, length: nanometres(nm) }
  } catch (error) {
    if (error instanceof NotUnderstood) return { ok: false, message: error.message, part: error.part }
    throw error
  }
}

const value = ({ whole = 0, fraction }: Quantity): number =>
  whole + (fraction ? fraction.numerator / fraction.denominator : 0)

const isMetric = (unit: LengthUnit | undefined): boolean =>
  unit !== undefined && unit !== 'ft' && unit !== 'in'

/** Adds the quantities up, in nanometres, each with the unit its place gives it. */
function total(quantities: Quantity[], house: 'in' | 'mm'): number {
  const units = unitsOf(quantities, house)
  quantities.forEach((quantity, i) => {
    const before = quantities[i - 1]
    const [unit, larger] = [units[i], units[i - 1]]
    if (before && unit && larger) checkFollows({ before, larger, quantity, unit })
  })
  return quantities.reduce((nm, quantity, i) => nm + value(quantity) * NM[units[i] ?? house], 0)
}

/** The unit of each quantity: as written, or what its place in the text can only mean. */
function unitsOf(quantities: Quantity[], house: 'in' | 'mm'): LengthUnit[] {
  const [first, second] = quantities
  if (!first) return []
  if (!second) return [first.unit ?? bareUnit(first, house)]
  if (!first.unit) return [feetByDash(quantities, house), 'in']
  return quantities
    .slice(1)
    .reduce<LengthUnit[]>(
      (units, quantity) => [...units, quantity.unit ?? unitAfter(units.at(-1), quantity)],
      [first.unit],
    )
}

function bareUnit(only: Quantity, house: 'in' | 'mm'): LengthUnit {
  const { text } = only
  if (house === 'mm' && only.fraction) {
    throw new NotUnderstood(
      text,
      `${quote(text)} is a fraction without a unit. Write ${text}" if inches are meant.`,
    )
  }
  if (house === 'in' && value(only) > MOST_BARE_INCHES) {
    const feet = Math.floor(value(only) / 12)
    const message = `${quote(text)} without a unit would be inches, over ${feet} ft. Write ${text} mm or ${text}".`
    throw new NotUnderstood(text, message)
  }
  return house
}

/** `12-4-3/8` and `12-4`: feet, then inches. Anything else after a bare number is not known to be anything. */
function feetByDash(quantities: Quantity[], house: 'in' | 'mm'): 'ft' {
  const [first, second, third] = quantities
  const plain =
    first && second?.dashed && second.whole !== undefined && !third && !first.decimal && !first.fraction
  if (
    plain &&
    second.unit !== 'ft' &&
    !isMetric(second.unit) &&
    (house === 'in' || second.fraction || second.unit)
  ) {
    return 'ft'
  }
  const [after, odd] = third && second?.dashed ? [second, third] : [first, second]
  const hint =
    house === 'in'
      ? 'Write feet and inches as 12\' 4 3/8", a fraction as 3/8.'
      : 'Write one number and its unit.'
  throw new NotUnderstood(
    odd?.text ?? '',
    `${quote(odd?.text ?? '')} after ${quote(after?.text ?? '')} was not understood. ${hint}`,
  )
}

/** A bare number after feet is inches; a bare fraction after inches is more of them. */
function unitAfter(larger: LengthUnit | undefined, quantity: Quantity): LengthUnit {
  if (larger === 'ft' || (larger === 'in' && quantity.whole === undefined)) return 'in'
  throw new NotUnderstood(
    quantity.text,
    `${quote(quantity.text)} has no unit. Write it with the unit, or leave it out.`,
  )
}

interface Following {
  before: Quantity
  larger: LengthUnit
  quantity: Quantity
  unit: LengthUnit
}

function checkFollows({ before, larger, quantity, unit }: Following): void {
  const { text } = quantity
  const fractionOfInch = larger === 'in' && unit === 'in' && quantity.whole === undefined && !before.fraction
  const smaller = NM[unit] < NM[larger] || fractionOfInch
  // Feet and inches are often joined by a dash; anywhere else it might mean less.
  const joined = !quantity.dashed || larger === 'ft'
  if (isMetric(unit) !== isMetric(larger) || !smaller || !joined) {
    throw new NotUnderstood(
      text,
      `${quote(text)} does not go after ${quote(before.text)}. Write the length in one unit, or as feet and inches.`,
    )
  }
  if (before.decimal || (before.fraction && !fractionOfInch)) {
    const message = `${quote(before.text)} already has a part, so ${quote(text)} after it was not understood. Write one of the two.`
    throw new NotUnderstood(text, message)
  }
  if (value(quantity) * NM[unit] >= NM[larger]) {
    const name = larger === 'ft' ? 'foot' : larger
    const message = `${quote(text)} after ${quote(before.text)} is not below one ${name}. Check it, or write the whole length in ${unit === 'in' ? 'inches' : unit}.`
    throw new NotUnderstood(text, message)
  }
}
