import { useState } from 'react'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { Card } from '@/components/page'
import { SafeForm } from '@/components/safe-form'
import { useAskBeforeLeaving } from '@/components/use-ask-before-leaving'
import { formatOfRules } from '@/lib/rules-format'
import { useSaveGuardRules } from './api/save-guard-rules'
import { ClimbFields } from './climb-fields'
import { FigureField } from './figure-field'
import { type LengthFigure, lengthFigures } from './figure-lines'
import { LoadFields } from './load-fields'
import { NameFields } from './name-fields'
import { NoteFields } from './note-fields'
import { RangeFields } from './range-fields'
import { SituationFields } from './situation-fields'
import { whyNotKept } from './why-not-kept'

interface GuardRulesFormProps {
  /** Of own rules that are there already. */
  known?: string
  start: GuardRules
  onSaved: (rules: GuardRules) => void
}

/** Own guard rules, to write or change, in the rules' own units. */
export function GuardRulesForm({ known, start, onSaved }: GuardRulesFormProps) {
  const [begunAs] = useState(start)
  const [rules, setRules] = useState(start)
  const { saving, save } = useSaving(known, onSaved, rules !== begunAs)
  const { error } = saving
  const set = (fields: Partial<GuardRules>) => setRules((now) => ({ ...now, ...fields }))
  const part = { rules, format: formatOfRules(rules), error, onChange: set }
  return (
    <SafeForm saveLabel="Save the guard rules" busy={saving.busy} error={error} onSave={() => save(rules)}>
      <NameFields rules={rules} isKnown={known !== undefined} error={error} onChange={set} />
      <Card>
        <SituationFields
          situations={rules.situations}
          format={part.format}
          error={error}
          onChange={(situations) => set({ situations })}
        />
      </Card>
      <Card title="Lengths">
        <div className="flex flex-col gap-3">
          {lengthFigures.map(([key, label]) => (
            <FigureField
              key={key}
              label={label}
              path={key}
              figure={rules[key]}
              format={part.format}
              required={key === 'sphere'}
              error={error}
              onChange={(figure) =>
                set({ [key]: figure } satisfies Partial<Record<LengthFigure, typeof figure>>)
              }
            />
          ))}
        </div>
      </Card>
      <RangeFields {...part} />
      <LoadFields {...part} />
      <ClimbFields {...part} />
      <NoteFields notes={rules.notes} error={error} onChange={(notes) => set({ notes })} />
    </SafeForm>
  )
}

/** Sends rules that can be meant, and asks before unsaved ones are left behind. */
function useSaving(known: string | undefined, onSaved: (rules: GuardRules) => void, changed: boolean) {
  const { mutate, reset, error, isPending } = useSaveGuardRules(known)
  const [fault, setFault] = useState<unknown>(null)
  const goOn = useAskBeforeLeaving(changed)
  const save = (rules: GuardRules) => {
    const why = whyNotKept(rules)
    setFault(why ?? null)
    if (why) {
      reset()
      return
    }
    mutate(rules, {
      onSuccess: () => {
        goOn()
        onSaved(rules)
      },
    })
  }
  return { saving: { error: fault ?? error, busy: isPending }, save }
}
