import { NM_PER_FOOT, NM_PER_INCH, NM_PER_MILLIMETRE } from './length'

/** How a length is shown: in feet and inches or inches alone to the nearest fraction, or in millimetres to 0.1. */
export type LengthFormat = { style: 'feet' | 'inches'; finest?: 16 | 32 | 64 } | { style: 'millimetres' }

/** A length taken apart for drawing: raised numerator, fraction slash, lowered denominator. */
export type LengthParts = {
  negative: boolean
  /** Rounding was needed; show ≈ before it. */
  approximate: boolean
} & (
  | {
      system: 'inch'
      /** Left out below one foot and where inches alone are shown. */
      feet?: number
      /** Left out where a fraction stands alone. */
      inches?: number
      /** In lowest terms; left out for whole inches. */
      fraction?: { numerator: number; denominator: number }
    }
  | { system: 'metric'; millimetres: string }
)

/** To the nearest whole step; midway to the even one, as NIST Handbook 44 reads between graduations. */
function nearestEven(steps: number): number {
  const below = Math.floor(steps)
  const rest = steps - below
  if (rest !== 0.5) return Math.round(steps)
  return below % 2 === 0 ? below : below + 1
}

/** Less than half a nanometre is the noise of a calculation, not a length. */
const isRounded = (nm: number, shown: number): boolean => Math.abs(nm - shown) >= 0.5

/**
 * Takes a length apart for showing. Inches go to the nearest 1/16, 1/32 or 1/64 (default), millimetres to 0.1, midway
 * to the even one; `approximate` says when that changed the length.
 *
 * @param nm a length, or a calculation's unrounded nanometres
 * @throws RangeError when the figure is not finite
 * @example 148 3/8 in as feet: { feet: 12, inches: 4, fraction: { numerator: 3, denominator: 8 } }
 */
export function formatLength(nm: number, format: LengthFormat): LengthParts {
  if (!Number.isFinite(nm)) throw new RangeError(`A length must be a finite number, not ${nm}.`)
  const size = Math.abs(nm)
  const step = format.style === 'millimetres' ? NM_PER_MILLIMETRE / 10 : NM_PER_INCH / (format.finest ?? 64)
  const steps = nearestEven(size / step)
  const rounding = { negative: nm < 0 && steps > 0, approximate: isRounded(size, steps * step) }
  if (format.style === 'millimetres') {
    const tenths = steps % 10
    const whole = (steps - tenths) / 10
    return { ...rounding, system: 'metric', millimetres: tenths === 0 ? `${whole}` : `${whole}.${tenths}` }
  }
  return { ...rounding, system: 'inch', ...inchParts(steps, format) }
}

function inchParts(steps: number, { style, finest = 64 }: { style: 'feet' | 'inches'; finest?: number }) {
  const stepsInFoot = finest * (NM_PER_FOOT / NM_PER_INCH)
  const feet = style === 'feet' ? Math.floor(steps / stepsInFoot) : 0
  const rest = steps - feet * stepsInFoot
  const inches = Math.floor(rest / finest)
  const fraction = lowestTerms(rest % finest, finest)
  return {
    ...(feet > 0 ? { feet } : {}),
    ...(feet > 0 || inches > 0 || !fraction ? { inches } : {}),
    ...(fraction ? { fraction } : {}),
  }
}

function lowestTerms(numerator: number, denominator: number) {
  if (numerator === 0) return undefined
  let terms = { numerator, denominator }
  while (terms.numerator % 2 === 0)
    terms = { numerator: terms.numerator / 2, denominator: terms.denominator / 2 }
  return terms
}

/** The parts as plain text with the unit. `parseLength` reads it back. @example `12' 4 3/8"`, `3/8"`, `3770.5 mm` */
export function lengthText(parts: LengthParts): string {
  const sign = `${parts.approximate ? '≈ ' : ''}${parts.negative ? '−' : ''}`
  if (parts.system === 'metric') return `${sign}${parts.millimetres} mm`
  const { feet, inches, fraction } = parts
  const pieces = [
    ...(inches === undefined ? [] : [`${inches}`]),
    ...(fraction ? [`${fraction.numerator}/${fraction.denominator}`] : []),
  ]
  return `${sign}${feet === undefined ? '' : `${feet}' `}${pieces.join(' ')}"`
}

/** A length as plain text. @throws RangeError when not finite. @example writeLength(inches(148.375), { style: 'feet' }) is `12' 4 3/8"` */
export const writeLength = (nm: number, format: LengthFormat): string => lengthText(formatLength(nm, format))
