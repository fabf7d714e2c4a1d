import type { $brand } from 'zod'

/** An amount of money in whole minor units (cents) of the company's currency. */
export type Money = number & $brand<'Money'>

/** Rounds an amount in main units (dollars) to whole minor units, halves away from zero. @throws RangeError when not finite. */
export function moneyFromMain(value: number): Money {
  if (!Number.isFinite(value)) throw new RangeError(`An amount must be a finite number, not ${value}.`)
  return (Math.sign(value) * Math.round(Math.abs(value) * 100)) as Money
}

/** Minor units as main units. */
export const moneyToMain = (amount: Money): number => amount / 100
