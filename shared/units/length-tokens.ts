/** What a written length is made of. `text` is the piece as it was written, `spaced` whether a space came before it. */
export type LengthToken = { text: string; spaced: boolean } & (
  | { kind: 'number'; value: number; decimal: boolean }
  | { kind: 'fraction'; numerator: number; denominator: number }
  | { kind: 'unit'; unit: LengthUnit }
  | { kind: 'dash' }
  | { kind: 'ambiguous' }
  | { kind: 'unknown' }
)
export type LengthUnit = 'ft' | 'in' | 'm' | 'cm' | 'mm'

const glyphs: Record<string, readonly [number, number]> = {
  '½': [1, 2],
  '⅓': [1, 3],
  '⅔': [2, 3],
  '¼': [1, 4],
  '¾': [3, 4],
  '⅕': [1, 5],
  '⅖': [2, 5],
  '⅗': [3, 5],
  '⅘': [4, 5],
  '⅙': [1, 6],
  '⅚': [5, 6],
  '⅛': [1, 8],
  '⅜': [3, 8],
  '⅝': [5, 8],
  '⅞': [7, 8],
  '⅒': [1, 10],
}

const words: Record<string, LengthUnit> = {
  ft: 'ft',
  foot: 'ft',
  feet: 'ft',
  in: 'in',
  ins: 'in',
  inch: 'in',
  inches: 'in',
  m: 'm',
  metre: 'm',
  metres: 'm',
  meter: 'm',
  meters: 'm',
  cm: 'cm',
  centimetre: 'cm',
  centimetres: 'cm',
  centimeter: 'cm',
  centimeters: 'cm',
  mm: 'mm',
  millimetre: 'mm',
  millimetres: 'mm',
  millimeter: 'mm',
  millimeters: 'mm',
}

/** Raised and lowered digits stand for the plain ones. */
const plainDigits = (text: string): number =>
  Number([...text].map((digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'.indexOf(digit) + '₀₁₂₃₄₅₆₇₈₉'.indexOf(digit) + 1).join(''))

type Found = LengthToken extends infer Token
  ? Token extends object
    ? Omit<Token, 'text' | 'spaced'>
    : never
  : never
type Reader = readonly [pattern: RegExp, read: (match: RegExpExecArray) => Found]

const fraction = (numerator: number, denominator: number): Found => ({
  kind: 'fraction',
  numerator,
  denominator,
})
const number = (written: string): Found => ({
  kind: 'number',
  value: Number(written),
  decimal: written.includes('.'),
})

/** Tried in this order at each place; the last takes one character, whatever it is. */
const readers: readonly Reader[] = [
  [/(\d+) *[/⁄∕] *(\d+)(?![.,]?\d)/y, ([, top, bottom]) => fraction(Number(top), Number(bottom))],
  [
    /([⁰¹²³⁴⁵⁶⁷⁸⁹]+)[/⁄∕]([₀₁₂₃₄₅₆₇₈₉]+)/y,
    ([, top = '', bottom = '']) => fraction(plainDigits(top), plainDigits(bottom)),
  ],
  [/[½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞⅒]/y, ([glyph]) => fraction(...(glyphs[glyph] ?? [0, 0]))],
  // 1,234.5 can only be a thousand; 1,234 may be a thousand or little more than one; 0,234 and 1,23 are decimals.
  [/\d{1,3}(?:,\d{3})+\.\d+/y, ([text]) => number(text.replaceAll(',', ''))],
  [/[1-9]\d{0,2}(?:,\d{3})+(?!\d)/y, () => ({ kind: 'ambiguous' })],
  [/\d+[.,]\d+|[.,]\d+|\d+\.(?!\d)|\d+/y, ([text]) => number(text.replace(',', '.').replace(/\.$/, ''))],
  [/["″”“]|['′’‘´`]{2}/y, () => ({ kind: 'unit', unit: 'in' })],
  [/['′’‘´`]/y, () => ({ kind: 'unit', unit: 'ft' })],
  [/[-‐‑–—−]/y, () => ({ kind: 'dash' })],
  [
    /(\p{L}+)\.?/uy,
    ([, word = '']) => {
      const unit = Object.hasOwn(words, word.toLowerCase()) ? words[word.toLowerCase()] : undefined
      return unit ? { kind: 'unit', unit } : { kind: 'unknown' }
    },
  ],
  [/./suy, () => ({ kind: 'unknown' })],
]

const SPACE = /\s/

/** Cuts a written length into its pieces; nothing is left out but spaces. */
export function lengthTokens(text: string): LengthToken[] {
  const tokens: LengthToken[] = []
  let at = 0
  let spaced = false
  while (at < text.length) {
    if (SPACE.test(text.charAt(at))) {
      at += 1
      spaced = true
      continue
    }
    for (const [pattern, read] of readers) {
      pattern.lastIndex = at
      const match = pattern.exec(text)
      if (!match) continue
      tokens.push({ ...read(match), text: match[0], spaced })
      at = pattern.lastIndex
      break
    }
    spaced = false
  }
  return tokens
}
