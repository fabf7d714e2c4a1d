import type { GuardRules } from '@shared/schemas/guard-rules'
import { Card } from '@/components/page'
import { RuleSource } from '@/components/rule-source'
import { figureLines } from './figure-lines'

/** Every figure with its section and how well it is known, and what else the rules say. */
export function GuardRulesFacts({ rules }: { rules: GuardRules }) {
  return (
    <div className="flex flex-col gap-4">
      <Card title="Figures">
        <dl>
          {figureLines(rules).map(({ what, value, source }, i) => (
            <div
              key={`${i} ${what}`}
              className="grid gap-x-6 border-b border-rule py-3 md:grid-cols-[2fr_1fr_2fr]"
            >
              <dt>{what}</dt>
              <dd className="figures text-lg font-medium">{value}</dd>
              <dd>
                <RuleSource source={source} />
              </dd>
            </div>
          ))}
        </dl>
      </Card>
      {rules.notes.length > 0 ? (
        <Card title="They also say">
          <ul className="flex flex-col gap-2">
            {rules.notes.map((note) => (
              <li key={note.text}>
                {note.text} <RuleSource source={note} />
              </li>
            ))}
          </ul>
        </Card>
      ) : null}
    </div>
  )
}
