import { useState } from 'react'
import { Button } from '@/components/button'
import { TextArea } from '@/components/field'

const LONGEST = 400

interface OverruleFormProps {
  onOverrule: (reason: string) => Promise<void>
  onCancel: () => void
}

/** Asks why a stop is let pass; the reason is kept and printed. */
export function OverruleForm({ onOverrule, onCancel }: OverruleFormProps) {
  const [reason, setReason] = useState('')
  const [fault, setFault] = useState<string>()
  const [busy, setBusy] = useState(false)
  return (
    <form
      className="mt-3 flex flex-col gap-2"
      onSubmit={(event) => {
        event.preventDefault()
        if (reason.trim() === '') {
          setFault('Write why it may pass: the reason is kept and printed with your name.')
          return
        }
        setBusy(true)
        void onOverrule(reason.trim()).finally(() => setBusy(false))
      }}
    >
      <TextArea
        label="Why may it pass?"
        hint="Kept and printed with your name. It counts only while these numbers stay as they are."
        error={fault}
        maxLength={LONGEST}
        autoFocus
        value={reason}
        onChange={(event) => {
          setReason(event.target.value)
          setFault(undefined)
        }}
      />
      <div className="flex flex-wrap gap-2">
        <Button type="submit" look="danger" busy={busy}>
          Overrule this stop
        </Button>
        <Button look="quiet" onClick={onCancel}>
          Leave it standing
        </Button>
      </div>
    </form>
  )
}
