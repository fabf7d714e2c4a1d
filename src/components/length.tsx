import { formatLength, type LengthFormat, lengthText } from '@shared/units/format-length'
import { classes } from './classes'

/** Measured figures are upright ink, computed ones spruce, struck ones struck through and still legible. */
export type LengthLook = 'measured' | 'computed' | 'struck'

const looks: Record<LengthLook, string> = {
  measured: 'text-ink',
  computed: 'text-spruce',
  struck: 'text-soft line-through',
}

/** A fraction as it is set in print: raised numerator, fraction slash, lowered denominator. */
function Fraction({ numerator, denominator }: { numerator: number; denominator: number }) {
  return (
    <span className="ml-[0.12em]">
      <sup className="text-[0.62em] leading-none align-[0.45em]">{numerator}</sup>
      <span>⁄</span>
      <sub className="text-[0.62em] leading-none align-baseline">{denominator}</sub>
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
            {parts.feet === undefined ? '' : `${parts.feet}′\u2009`}
            {parts.inches ?? ''}
            {parts.fraction ? <Fraction {...parts.fraction} /> : null}″
          </>
        )}
      </span>
    </span>
  )
}
