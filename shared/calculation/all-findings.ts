import type { Finding, FindingLevel } from '../schemas/finding'
import { once } from './findings/once'

/** The gravest first. */
const gravity: Record<FindingLevel, number> = { stop: 0, check: 1, note: 2 }

/** Everything noticed about a survey, by the cut list and by the checks, each once, the gravest first. */
export const allFindings = (
  cutList: { findings: readonly Finding[] },
  checks: { findings: readonly Finding[] },
): Finding[] =>
  once([...cutList.findings, ...checks.findings]).sort((a, b) => gravity[a.level] - gravity[b.level])
