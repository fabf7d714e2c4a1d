import type { Finding } from '@shared/schemas/finding'
import type { Survey } from '@shared/schemas/survey'
import { type Overruling, overrulingOf } from '@shared/survey/overrule'

/** A finding and, for a *stop* that was let pass, by whom and why. */
export interface JudgedFinding {
  finding: Finding
  overruling?: Overruling
}

/** Each finding with how it was overruled, if it was. */
export const judge = (survey: Survey, findings: readonly Finding[]): JudgedFinding[] =>
  findings.map((finding) => {
    const overruling = overrulingOf(survey, finding)
    return overruling ? { finding, overruling } : { finding }
  })

/** How a stop was let pass. */
export function overrulingText({ overrule, stands }: Overruling): string {
  const who = `${overrule.by ?? 'somebody unnamed'}${overrule.on ? ` on ${overrule.on.slice(0, 10)}` : ''}`
  return stands
    ? `Overruled by ${who}: ${overrule.reason}`
    : `Was overruled by ${who} with other numbers, which no longer counts: ${overrule.reason}`
}
