import type { CutListDocument } from './cut-list-document'

const denominators = [16, 32, 64] as const

/**
 * Spreadsheet number format for lengths that must not be shown shorter or longer than they are: the company's
 * fraction, a finer one where a length needs it, decimals where no fraction shows it exactly. Millimetres to 0.1.
 */
export function lengthFormat(lengths: readonly number[], { units, fraction }: FormatChoice): string {
  if (units === 'mm') return lengths.every(isTenth) ? '0.0' : '0.000'
  const exact = denominators.find(
    (denominator) =>
      denominator >= fraction && lengths.every((length) => Number.isInteger(length * denominator)),
  )
  return exact ? `# ??/${exact}` : '0.0000'
}

type FormatChoice = Pick<CutListDocument, 'units' | 'fraction'>

const isTenth = (length: number): boolean => Math.abs(length * 10 - Math.round(length * 10)) < 1e-6

/** Format for a figure that is only looked at, such as a finish length: the company's fraction, or 0.1 mm. */
export const nearFormat = ({ units, fraction }: FormatChoice): string =>
  units === 'mm' ? '0.0' : `# ??/${fraction}`

/** Format for take-up, which is small beside a fraction of an inch. */
export const takeUpFormat = ({ units }: FormatChoice): string => (units === 'mm' ? '0.0' : '0.000')
