/** What a row is made of: the lengths of its bays, and the sizes of the posts between them, one fewer; all in nm. */
export interface Row {
  bays: readonly number[]
  posts: readonly number[]
}

interface Best {
  parts: number
  squares: number
  /** Where the last part begins. */
  from: number
}

/**
 * Divides a row at its posts into the fewest parts no longer than `longest`, as even as they can be: of all ways with that
 * many parts, the one with the least sum of squared lengths. A bay that is too long by itself stays whole.
 *
 * @param longest nm; no limit when undefined
 * @returns the number of bays in each part, in order
 * @example five bays of 10 under 25, posts of no size: 2, 2 and 1
 */
export function splitEvenly({ bays, posts }: Row, longest: number | undefined): number[] {
  if (bays.length === 0) return []
  const best: Best[] = [{ parts: 0, squares: 0, from: 0 }]
  for (let to = 1; to <= bays.length; to += 1) {
    let found: Best | undefined
    let length = 0
    for (let from = to - 1; from >= 0; from -= 1) {
      length += (bays[from] ?? 0) + (from < to - 1 ? (posts[from] ?? 0) : 0)
      if (longest !== undefined && length > longest && from < to - 1) break
      const before = best[from]
      if (!before) continue
      const candidate = { parts: before.parts + 1, squares: before.squares + length * length, from }
      if (!found || isBetter(candidate, found)) found = candidate
    }
    if (found) best.push(found)
  }
  const sizes: number[] = []
  for (let to = bays.length; to > 0; to = best[to]?.from ?? 0) sizes.unshift(to - (best[to]?.from ?? 0))
  return sizes
}

const isBetter = (a: Best, b: Best): boolean =>
  a.parts === b.parts ? a.squares < b.squares : a.parts < b.parts
