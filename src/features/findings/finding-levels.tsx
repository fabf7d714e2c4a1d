import { type ReactNode, useState } from 'react'
import { type Finding, type FindingLevel, findingLevels } from '@shared/schemas/finding'
import { ChoiceGroup } from '@/components/choices'
import { FindingMark } from '@/components/finding-mark'
import { EmptyState } from '@/components/states'

const words: Record<FindingLevel, { title: string; meaning: string; none: string }> = {
  stop: {
    title: 'Stops',
    meaning: 'The work does not go on like this, unless an owner or estimator lets it pass.',
    none: 'No stop: nothing noticed holds the work back.',
  },
  check: {
    title: 'Checks',
    meaning: 'Somebody should look at these before the work goes on.',
    none: 'No check: nothing noticed needs a look before the work goes on.',
  },
  note: {
    title: 'Notes',
    meaning: 'Good to know; nothing to be done.',
    none: 'No note: nothing else was noticed.',
  },
}
/** The gravest first. */
const levels = [...findingLevels].reverse()

interface FindingLevelsProps {
  findings: readonly Finding[]
  show: (finding: Finding) => ReactNode
}

/** All findings by severity, with a choice of what to see. */
export function FindingLevels({ findings, show }: FindingLevelsProps) {
  const [shown, setShown] = useState<'all' | FindingLevel>('all')
  if (findings.length === 0) {
    return (
      <EmptyState title="Nothing was noticed">
        What was entered agrees with itself, the house rules and the guard rules chosen. That is arithmetic:
        local code, the authority having jurisdiction and a licensed engineer decide.
      </EmptyState>
    )
  }
  const of = (level: FindingLevel) => findings.filter((finding) => finding.level === level)
  const choices = [
    { value: 'all' as const, label: `All (${findings.length})` },
    ...levels.map((level) => ({ value: level, label: `${words[level].title} (${of(level).length})` })),
  ]
  return (
    <div className="flex flex-col gap-6">
      <ChoiceGroup label="Show" quiet choices={choices} value={shown} onChange={setShown} />
      {shown !== 'all' && of(shown).length === 0 ? <p>{words[shown].none}</p> : null}
      {levels
        .filter((level) => (shown === 'all' || shown === level) && of(level).length > 0)
        .map((level) => (
          <section key={level} aria-label={words[level].title} className="flex flex-col gap-2">
            <h2 className="flex items-center gap-2 text-lg font-semibold">
              <FindingMark level={level} />
              {words[level].title}
            </h2>
            <p className="text-sm text-soft">{words[level].meaning}</p>
            <ul className="flex flex-col gap-2">
              {of(level).map((finding) => (
                <li key={finding.text}>{show(finding)}</li>
              ))}
            </ul>
          </section>
        ))}
    </div>
  )
}
