import type { Hardware } from '../schemas/hardware'
import type { HouseRules } from '../schemas/house-rules'

/**
 * The longest run to propose for a cable, nm: the greatest `maxRun` of the fittings made for it, or the house's own
 * longest run where that is less.
 * @returns undefined where neither sets a limit
 */
export function longestRun(
  { fittings }: Pick<Hardware, 'fittings'>,
  rules: Pick<HouseRules, 'longestRun'>,
  cable: string,
): number | undefined {
  const limits = fittings
    .filter(({ cables }) => cables.includes(cable))
    .map(({ maxRun = Infinity }) => maxRun)
  const longest = Math.min(rules.longestRun ?? Infinity, limits.length > 0 ? Math.max(...limits) : Infinity)
  return longest === Infinity ? undefined : longest
}
