import { type LengthToken, type LengthUnit, lengthTokens } from './length-tokens'

/** A number, a fraction or both, with its unit where one is written. */
export interface Quantity {
  text: string
  whole?: number
  decimal: boolean
  fraction?: { numerator: number; denominator: number; text: string }
  unit?: LengthUnit
  /** A dash stands between this quantity and the one before. */
  dashed: boolean
}

/** Why a text is no length, and the part of it that is to blame. */
export class NotUnderstood extends Error {
  constructor(
    readonly part: string,
    message: string,
  ) {
    super(message)
  }
}

const EXAMPLES = { in: '12\' 4 3/8" or 148 3/8', mm: '3770 or 3.77 m' }

export const quote = (text: string): string => `“${text.length > 24 ? `${text.slice(0, 23)}…` : text}”`

/** Reads a text as numbers and fractions with their units. @throws NotUnderstood */
export function readQuantities(text: string, house: 'in' | 'mm'): Quantity[] {
  const tokens = lengthTokens(text)
  const example = EXAMPLES[house]
  if (tokens.length === 0)
    throw new NotUnderstood('', `Nothing is written here. Write a length such as ${example}.`)
  const [first] = tokens
  if (first?.kind === 'dash') {
    throw new NotUnderstood(first.text, 'A length cannot be below zero. Leave the sign out.')
  }
  const quantities: Quantity[] = []
  for (let at = 0; at < tokens.length;) {
    const dashed = at > 0 && tokens[at]?.kind === 'dash'
    const { quantity, next } = readQuantity(tokens, dashed ? at + 1 : at, { dashed, example })
    quantities.push(quantity)
    at = next
  }
  return quantities
}

interface Here {
  dashed: boolean
  example: string
}

function readQuantity(
  tokens: LengthToken[],
  start: number,
  { dashed, example }: Here,
): { quantity: Quantity; next: number } {
  let next = start
  const quantity: Quantity = { text: '', decimal: false, dashed }
  const take = () => {
    const token = tokens[next]
    if (token) quantity.text += `${token.spaced && quantity.text ? ' ' : ''}${token.text}`
    next += 1
  }
  const first = tokens[next]
  if (first?.kind === 'number') {
    Object.assign(quantity, { whole: first.value, decimal: first.decimal })
    take()
    if (joinedByDash(tokens, next)) take()
  }
  const second = tokens[next]
  if (second?.kind === 'fraction') {
    quantity.fraction = second
    take()
  }
  if (next === start) throw strange(tokens, start, example)
  const last = tokens[next]
  if (last?.kind === 'unit') {
    quantity.unit = last.unit
    take()
  }
  checkFraction(quantity)
  return { quantity, next }
}

/** `4-3/8` without spaces is four and three eighths; `4 - 3/8` might mean less. */
function joinedByDash(tokens: LengthToken[], at: number): boolean {
  const [dash, fraction] = [tokens[at], tokens[at + 1]]
  return dash?.kind === 'dash' && fraction?.kind === 'fraction' && !dash.spaced && !fraction.spaced
}

function strange(tokens: LengthToken[], at: number, example: string): NotUnderstood {
  const token = tokens[at]
  if (!token) {
    const before = tokens[at - 1]?.text ?? ''
    return new NotUnderstood(
      before,
      `Something is missing after ${quote(before)}. Write a length such as ${example}.`,
    )
  }
  if (token.kind === 'ambiguous') {
    const [plain, decimal] = [token.text.replaceAll(',', ''), token.text.replace(',', '.')]
    const message = `${quote(token.text)} could be ${plain} or ${decimal}. Write one of these.`
    return new NotUnderstood(token.text, message)
  }
  if (token.kind === 'unit') {
    return new NotUnderstood(
      token.text,
      `There is no number before ${quote(token.text)}. Write a length such as ${example}.`,
    )
  }
  const message = `${quote(token.text)} was not understood. Write a length such as ${example}.`
  return new NotUnderstood(token.text, message)
}

function checkFraction({ whole, decimal, fraction, text }: Quantity): void {
  if (!fraction) return
  const { numerator, denominator } = fraction
  if (denominator === 0) {
    throw new NotUnderstood(
      fraction.text,
      `${quote(fraction.text)} divides by zero. Write a fraction such as 3/8.`,
    )
  }
  if (decimal) {
    throw new NotUnderstood(text, `${quote(text)} has decimals and a fraction. Write one of the two.`)
  }
  if (numerator < denominator) return
  const sum = (whole ?? 0) + Math.floor(numerator / denominator)
  const rest = numerator % denominator
  const meant = rest === 0 ? `${sum}` : `${sum} ${rest}/${denominator}`
  const message = `The fraction ${quote(fraction.text)} is not below one. Write ${meant} if that is meant.`
  throw new NotUnderstood(fraction.text, message)
}
