/** First characters that make a spreadsheet read text as a formula (OWASP, CSV Injection; ASVS 5.0 1.2.10), and their full-width twins. */
const dangerous = /^[=+\-@\t\r\n\0＝＋－＠]/
/** Characters that XML 1.0 cannot carry. */
// eslint-disable-next-line no-control-regex
const unwritable = /[\0-\x08\x0b\x0c\x0e-\x1f\ufffe\uffff]/g

/** The most a spreadsheet cell holds. */
const LONGEST_CELL = 32_767

/** Text without what a file of XML could not carry. */
export const writableText = (text: string): string => text.replace(unwritable, '')

/** Text for a spreadsheet cell that no spreadsheet takes for a formula. True numbers are written as numbers instead. */
export function safeText(text: string): string {
  const written = writableText(text)
  const safe = dangerous.test(text) || dangerous.test(written) ? `'${written}` : written
  return safe.slice(0, LONGEST_CELL)
}
