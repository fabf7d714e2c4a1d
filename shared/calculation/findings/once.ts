import type { Finding } from '../../schemas/finding'

/** What two runs say alike of a post they share is said once. */
export function once(findings: readonly Finding[]): Finding[] {
  const said = new Set<string>()
  return findings.filter(({ text }) => !said.has(text) && said.add(text))
}
