import type { CutListDocument } from './cut-list-document'

/** The finest fraction that two digits under the line hold. */
const FINEST = 64

/**
 * Spreadsheet number format for lengths that must not be shown shorter or longer than they are: a fraction in lowest
 * terms where each is one to 1/64, decimals where not. Millimetres to 0.1.
 */
export function lengthFormat(lengths: readonly number[], { units }: Pick<FormatChoice, 'units'>): string {
  if (units === 'mm') return lengths.every(isTenth) ? '0.0' : '0.000'
  return lengths.every((length) => Number.isInteger(length * FINEST)) ? '# ??/??' : '0.0000'
}

type FormatChoice = Pick<CutListDocument, 'units' | 'fraction'>

const isTenth = (length: number): boolean => Math.abs(length * 10 - Math.round(length * 10)) < 1e-6

/** Format for a figure that is only looked at, such as a finish length: the company's fraction, or 0.1 mm. */
export const nearFormat = ({ units, fraction }: FormatChoice): string =>
  units === 'mm' ? '0.0' : `# ??/${fraction}`

/** Format for take-up, which is small beside a fraction of an inch. */
export const takeUpFormat = ({ units }: FormatChoice): string => (units === 'mm' ? '0.0' : '0.000')
