import type { Degrees } from './angle'

/** An angle in degrees to a tenth, with the sign for degrees. @throws RangeError when not finite. @example 34.992 is `35°` */
export function writeAngle(degrees: Degrees): string {
  if (!Number.isFinite(degrees)) throw new RangeError(`An angle must be a finite number, not ${degrees}.`)
  const tenths = Math.round(Math.abs(degrees) * 10) / 10
  return `${degrees < 0 && tenths > 0 ? '−' : ''}${tenths}°`
}
