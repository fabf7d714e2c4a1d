import { Fragment } from 'react'
import { type Phrase, writePhrase } from '@shared/calculation/phrase'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { Length } from '@/components/length'
import { Card } from '@/components/page'
import { RuleSource } from '@/components/rule-source'
import { formatOfRules } from '@/lib/rules-format'
import { figureLines } from './figure-lines'

/** Every figure with its section and how well it is known, and what else the rules say. */
export function GuardRulesFacts({ rules }: { rules: GuardRules }) {
  return (
    <div className="flex flex-col gap-4">
      <Card title="Figures">
        <dl>
          {figureLines(rules).map(({ what, value, source }, i) => (
            <div key={i} className="grid gap-x-6 border-b border-rule py-3 md:grid-cols-[2fr_1fr_2fr]">
              <dt>
                <RulesPhrase phrase={what} rules={rules} />
              </dt>
              <dd className="figures text-lg font-medium">
                <RulesPhrase phrase={value} rules={rules} />
              </dd>
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

/** A phrase in the rules’ own units, its lengths with true fractions. */
const RulesPhrase = ({ phrase, rules }: { phrase: Phrase; rules: GuardRules }) =>
  phrase.map((part, i) => (
    <Fragment key={i}>
      {typeof part !== 'string' && 'length' in part ? (
        <Length value={part.length} format={formatOfRules(rules)} />
      ) : (
        writePhrase([part], rules.units)
      )}
    </Fragment>
  ))
