import type { GuardSummaryDocument } from '../guard-summary-document'
import { type JudgedFinding, overrulingText } from '../judged-finding'
import type { Printed } from './quantities'

const MOST = 24

/** Stops and checks as lines, overruled ones with who, when and why. */
export function findingLines({ findings }: GuardSummaryDocument): string[] {
  const grave = findings.filter(({ finding }) => finding.level !== 'note')
  if (grave.length === 0) return ['Nothing was found that stops the work or wants looking at.']
  const lines = grave.slice(0, MOST).map(findingLine)
  return grave.length > MOST ? [...lines, `And ${grave.length - MOST} more: see the survey.`] : lines
}

export function findingLine({ finding, overruling }: JudgedFinding): string {
  const { level, text, rule } = finding
  const behind = rule === undefined ? '' : ` [${rule}]`
  return `${level.toUpperCase()}: ${text}${behind}${overruling ? ` ${overrulingText(overruling)}` : ''}`
}

/** What the figures rest on. */
export function assumptionLines({ rules, checks, findings }: GuardSummaryDocument, print: Printed): string[] {
  const lumber = new Set(
    checks.posts.flatMap(({ allowable }) =>
      allowable
        ? [
            `${allowable.lumber.name}: Fb ${print.stress(allowable.lumber.bending)}, C_F ${allowable.lumber.sizeFactor}, C_M ${allowable.wetFactor}, E ${print.stress(allowable.lumber.modulus)} (NDS Supplement, read in a copy); all other factors are the engineer’s.`,
          ]
        : [],
    ),
  )
  const hot = checks.runs.map(
    ({ run, whenCold, whenHot }) => `${run} ${print.force(whenCold)} / ${print.force(Math.max(0, whenHot))}`,
  )
  const notes = findings.flatMap(({ finding: { code, text } }) => (noted.has(code) ? [text] : []))
  return [
    'Cables slide freely through the posts they pass; posts do not give way under push and infill load. No US code sets a force for the sphere: the push is shown for information.',
    ...lumber,
    ...(hot.length > 0
      ? [
          `Tensioned at ${rules.tensionedAt} °C; at ${rules.coldest} / ${rules.hottest} °C the tension of a cable is: ${hot.join(', ')}.`,
        ]
      : []),
    ...notes,
  ]
}

/** Notes that say what was assumed. */
const noted: ReadonlySet<string> = new Set([
  'support-unknown',
  'situation-assumed',
  'corner-assumed',
  'fall-unknown',
])
