import type { SurveyResult } from '../calculation/result'
import type { CalculationInput } from '../calculation/survey-index'

/** How many of a fitting to take from the shelf. */
export interface FittingPick {
  id: string
  name: string
  count: number
}

/** How much of a cable is cut. */
export interface CablePick {
  id: string
  name: string
  /** How many pieces. */
  count: number
  /** All cut lengths added up, nm. */
  length: number
}

/** What a cut list takes from the shelf and the reels; cables without a length take nothing. In the catalogue's order. */
export function fittingsToPick(
  { runs }: SurveyResult,
  { hardware }: Pick<CalculationInput, 'hardware'>,
): { fittings: FittingPick[]; cables: CablePick[] } {
  const fittings = new Map(hardware.fittings.map(({ id, name }) => [id, { id, name, count: 0 }]))
  const cables = new Map(hardware.cables.map(({ id, name }) => [id, { id, name, count: 0, length: 0 }]))
  for (const run of runs) {
    for (const cable of run.cables) {
      if (cable.mode === 'none') continue
      for (const id of [cable.from, cable.to]) {
        const fitting = fittings.get(id)
        if (fitting) fitting.count += 1
      }
      const reel = cables.get(run.cable)
      if (!reel) continue
      reel.count += 1
      reel.length += cable.cut
    }
  }
  const picked = <Pick extends { count: number }>(picks: Map<string, Pick>) =>
    [...picks.values()].filter(({ count }) => count > 0)
  return { fittings: picked(fittings), cables: picked(cables) }
}
