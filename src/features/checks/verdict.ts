import type { Finding, FindingLevel } from '@shared/schemas/finding'

/** How a figure fares against what is asked of it. */
export type Verdict = 'holds' | FindingLevel

/** What was found of one place, by code. */
export type Found = ReadonlyMap<string, FindingLevel>

/** What was found of a bay or a post of a run. A finding of no run is of every run there; one of no bay is not a bay's. */
export const foundAt = (
  findings: readonly Finding[],
  place: { run: string; bay?: string; post?: string },
): Found =>
  new Map(
    findings
      .filter(
        ({ where }) =>
          where.bay === place.bay &&
          where.post === place.post &&
          (where.run === undefined || where.run === place.run),
      )
      .map(({ code, level }) => [code, level]),
  )

/** The gravest that was found under these codes, else that it holds. */
export function verdictOf(found: Found, ...codes: readonly string[]): Verdict {
  const levels = new Set(codes.map((code) => found.get(code)))
  return (['stop', 'check', 'note'] as const).find((level) => levels.has(level)) ?? 'holds'
}
