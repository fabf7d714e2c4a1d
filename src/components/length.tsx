import { formatLength, type LengthFormat, lengthText } from '@shared/units/format-length'
import { classes } from './classes'

/** Measured figures are upright ink, computed ones spruce, struck ones struck through and still legible. */
export type LengthLook = 'measured' | 'computed' | 'struck'

const looks: Record<LengthLook, string> = {
  measured: 'text-ink',
  computed: 'text-spruce',
  // One line across all sizes of figure; a text decoration would break at the fraction.
  struck:
    'relative text-soft after:absolute after:inset-x-0 after:top-1/2 after:border-t-2 after:border-current',
}

/**
 * A fraction as it is set in print: raised numerator, fraction slash, lowered denominator. `static` undoes the shift
 * that the base styles give raised and lowered text, so that both stand between baseline and cap height.
 */
function Fraction({ numerator, denominator }: { numerator: number; denominator: number }) {
  return (
    <span className="ml-[0.14em]">
      <sup className="static align-[0.4em] text-[0.64em] leading-none">{numerator}</sup>
      <span>⁄</span>
      <sub className="static align-baseline text-[0.64em] leading-none">{denominator}</sub>
    </span>
  )
}

interface LengthProps {
  /** Nanometres. */
  value: number
  format: LengthFormat
  look?: LengthLook
  className?: string
}

/** A length with its unit, drawn as a tape says it and spoken as plain text. */
export function Length({ value, format, look = 'measured', className }: LengthProps) {
  const parts = formatLength(value, format)
  return (
    <span className={classes('figures whitespace-nowrap', looks[look], className)}>
      <span className="sr-only">
        {look === 'struck' ? 'struck: ' : ''}
        {lengthText(parts)}
      </span>
      <span aria-hidden="true">
        {parts.approximate ? '≈\u2009' : ''}
        {parts.negative ? '−' : ''}
        {parts.system === 'metric' ? (
          <>
            {parts.millimetres}
            <span className="ml-[0.2em] text-[0.7em] text-soft">mm</span>
          </>
        ) : (
          <>
            {/* No space after it: the face gives its single prime a gap of its own. */}
            {parts.feet === undefined ? '' : `${parts.feet}′`}
            {parts.inches ?? ''}
            {parts.fraction ? <Fraction {...parts.fraction} /> : null}″
          </>
        )}
      </span>
    </span>
  )
}
