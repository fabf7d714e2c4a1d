import { type CutLength, fitsTakeUp, shopCut, type ShopCut } from './cut-length'

/**
 * One length for all cables of a run, where that fits.
 *
 * Formula: if every cable is *shop* and the run's longest cut still satisfies slack + U + stretch ≤ limit for each one,
 * all get that length; else each keeps its own.
 * Units: nm.
 * Source: section 6 of the calculation, `grouping: "run"`.
 *
 * @example cuts of 95.6875 and 95.75 in with take-up to spare: both 95.75 in
 */
export function groupCuts(cuts: readonly CutLength[]): CutLength[] {
  const shop = cuts.filter((cut): cut is ShopCut => cut.mode === 'shop')
  const [first] = shop
  if (!first || shop.length < cuts.length) return [...cuts]
  const longest = shop.reduce((most, { cut }) => (cut > most ? cut : most), first.cut)
  return shop.every((cut) => fitsTakeUp(longest, cut)) ? shop.map((cut) => shopCut(longest, cut)) : [...cuts]
}
