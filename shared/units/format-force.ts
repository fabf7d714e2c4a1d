import { toPoundsForce } from './force'

/**
 * A force, newtons, to the nearest whole pound-force or newton, with its unit.
 * @throws RangeError when not finite
 * @example 667.233 N is `150 lbf`
 */
export function writeForce(force: number, unit: 'lbf' | 'N'): string {
  if (!Number.isFinite(force)) throw new RangeError(`A force must be a finite number, not ${force}.`)
  const value = Math.round(Math.abs(unit === 'lbf' ? toPoundsForce(force) : force))
  return `${force < 0 && value > 0 ? '−' : ''}${value} ${unit}`
}
