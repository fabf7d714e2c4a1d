import type { Finding } from '@shared/schemas/finding'
import { overrulingOf } from '@shared/survey/overrule'
import { FindingItem } from '@/components/finding-mark'
import { OverrulingText } from '@/components/overruling-text'
import type { EditorView } from '../model/editor-context'
import { doubtCodes } from './reading-doubts'

/** Whether a finding is about what is in hand. */
export function isAbout(
  { where }: Finding,
  { kind, id }: { kind: 'post' | 'bay' | 'run'; id: string },
): boolean {
  if (kind === 'run') return where.run === id && where.bay === undefined && where.post === undefined
  return where[kind] === id
}

interface PanelFindingsProps {
  view: EditorView
  of: { kind: 'post' | 'bay' | 'run'; id: string }
}

/** What was noticed about what is in hand, the gravest first, beside what its readings say themselves. */
export function PanelFindings({ view, of }: PanelFindingsProps) {
  const findings = view.findings.filter((finding) => isAbout(finding, of) && !doubtCodes.has(finding.code))
  if (findings.length === 0) return null
  return (
    <section aria-label="What was noticed here">
      <ul aria-label="Findings" className="flex flex-col gap-2">
        {findings.map((finding) => {
          const overruling = overrulingOf(view.survey, finding)
          return (
            <li key={finding.text}>
              <FindingItem finding={finding} muted={overruling?.stands === true}>
                {overruling ? <OverrulingText overruling={overruling} /> : null}
              </FindingItem>
            </li>
          )
        })}
      </ul>
      <p className="mt-2 text-sm text-soft">
        Arithmetic on what was entered. Confirm with the authority having jurisdiction.
      </p>
    </section>
  )
}
