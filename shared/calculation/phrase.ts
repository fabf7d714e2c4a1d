import type { Units } from '../schemas/quantities'
import { toPoundsForce } from '../units/force'
import { toPsi } from '../units/stress'
import { NM_PER_INCH, toMillimetres } from '../units/length'

/** A number inside a sentence, in the program's own units, so that each reader sees it in theirs. */
export type Figure =
  | { length: number }
  | { angle: number }
  | { force: number }
  | { stress: number }
  | { number: number }
  | { percent: number }

/** A sentence with its numbers still numbers. */
export type Phrase = readonly (string | Figure)[]

const places = (value: number, most: number): string => String(Number(value.toFixed(most)))

const SIXTY_FOURTH = NM_PER_INCH / 64

/** A length in inches with a true fraction where it is one, else to four places. */
function inchText(nm: number): string {
  const parts = nm / SIXTY_FOURTH
  const whole = Math.trunc(parts / 64)
  let numerator = Math.abs(Math.round(parts) - whole * 64)
  if (Math.abs(parts - Math.round(parts)) > 1e-6 || numerator === 0)
    return `${places(nm / NM_PER_INCH, 4)} in`
  let denominator = 64
  for (; numerator % 2 === 0; denominator /= 2) numerator /= 2
  const sign = nm < 0 ? '−' : ''
  return `${sign}${whole === 0 ? '' : `${Math.abs(whole)} `}${numerator}/${denominator} in`
}

/** N/mm² as psi or as it is. */
const stressText = (stress: number, { length }: Units): string =>
  length === 'in' ? `${places(toPsi(stress), 0)} psi` : `${places(stress, 2)} N/mm²`

function figureText(figure: Figure, units: Units): string {
  if ('length' in figure) {
    return units.length === 'in' ? inchText(figure.length) : `${places(toMillimetres(figure.length), 2)} mm`
  }
  if ('angle' in figure) return `${places(figure.angle, 2)}°`
  if ('stress' in figure) return stressText(figure.stress, units)
  if ('percent' in figure) return `${places(figure.percent * 100, 3)} %`
  if ('number' in figure) return places(figure.number, 6)
  return units.force === 'lbf'
    ? `${places(toPoundsForce(figure.force), 1)} lbf`
    : `${places(figure.force, 1)} N`
}

/** A phrase as plain text in the units given. @example ['Cut at ', { length: inches(95.75) }] → "Cut at 95 3/4 in" */
export const writePhrase = (phrase: Phrase, units: Units): string =>
  phrase.map((part) => (typeof part === 'string' ? part : figureText(part, units))).join('')
