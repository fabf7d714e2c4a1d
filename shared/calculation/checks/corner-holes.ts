/** A hole drilled into one face of a post for a fitting's body; nm. */
export interface BodyHole {
  body: number
  diameter: number
}

export interface CornerHoles {
  /** How far the holes run into each other at one height, nm; negative while there is wood between them. */
  overlap: number
  /** How far apart in height the two runs' holes must be, nm; 0 when none is needed. */
  stagger: number
}

/**
 * Two holes drilled from adjacent faces of a post at one height, each centred in its face.
 *
 * Formula: hole A goes in along `along`, hole B along `across`:
 * `overlap = min(A − (along / 2 − dB / 2), B − (across / 2 − dA / 2))`. Above `cornerOverlap` one run is staggered by
 * `dA / 2 + dB / 2 + cornerWeb`.
 * Units: nm.
 * Source: section 9 of the calculation; common practice, no source.
 *
 * @example two 1 1/2 in bodies in 9/16 in holes in a 3 1/2 in post: 1/32 in, no stagger
 */
export function cornerHoles(
  { a, b }: { a: BodyHole; b: BodyHole },
  { along, across }: { along: number; across: number },
  { cornerOverlap, cornerWeb }: { cornerOverlap: number; cornerWeb: number },
): CornerHoles {
  const overlap = Math.min(a.body - (along / 2 - b.diameter / 2), b.body - (across / 2 - a.diameter / 2))
  const needed = overlap - cornerOverlap > 1e-3
  return { overlap, stagger: needed ? a.diameter / 2 + b.diameter / 2 + cornerWeb : 0 }
}

/** The least difference in height between holes of two runs, nm; Infinity when one has none. Both from the lowest up. */
export function leastApart(a: readonly number[], b: readonly number[]): number {
  let least = Infinity
  let j = 0
  for (const height of a) {
    for (let next = b[j + 1]; next !== undefined && next <= height; next = b[j + 1]) j += 1
    for (const other of [b[j], b[j + 1]]) {
      if (other !== undefined) least = Math.min(least, Math.abs(other - height))
    }
  }
  return least
}
