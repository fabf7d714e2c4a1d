import { type ReactNode, useState } from 'react'
import type { Finding } from '@shared/schemas/finding'
import { mayBeOverruled, type Overruling } from '@shared/survey/overrule'
import { Button } from '@/components/button'
import { FindingItem } from '@/components/finding-mark'
import { OverrulingText } from '@/components/overruling-text'
import { OverruleForm } from './overrule-form'

export interface Overruler {
  /** Lets a stop pass, with its reason. @returns whether that was kept; if not, why was said */
  overrule: (finding: Finding, reason: string) => Promise<boolean>
  /** Makes it stand again. @returns whether that was kept; if not, why was said */
  uphold: (finding: Finding) => Promise<boolean>
}

interface JudgedFindingProps {
  finding: Finding
  overruling?: Overruling | undefined
  /** Only for those who may. */
  overruler?: Overruler | undefined
  /** A way to where it is. */
  goThere: ReactNode
}

/** A finding, the rule behind it, a way there, and for a *stop* how it was let pass or a way to do that. */
export function JudgedFinding({ finding, overruling, overruler, goThere }: JudgedFindingProps) {
  const [asking, setAsking] = useState(false)
  const stands = overruling?.stands === true
  return (
    <FindingItem finding={finding} muted={stands} action={goThere}>
      {overruling ? <OverrulingText overruling={overruling} /> : null}
      {overruler && finding.level === 'stop' && mayBeOverruled(finding) ? (
        asking ? (
          <OverruleForm
            onOverrule={async (reason) => {
              // A reason that could not be kept stays on the screen, to be sent again.
              if (await overruler.overrule(finding, reason)) setAsking(false)
            }}
            onCancel={() => setAsking(false)}
          />
        ) : stands ? (
          <BusyButton onPress={() => overruler.uphold(finding)}>Make it stand again</BusyButton>
        ) : (
          <Button look="quiet" className="-ml-4" onClick={() => setAsking(true)}>
            Overrule
          </Button>
        )
      ) : null}
    </FindingItem>
  )
}

function BusyButton({ onPress, children }: { onPress: () => Promise<unknown>; children: ReactNode }) {
  const [busy, setBusy] = useState(false)
  return (
    <Button
      look="quiet"
      className="-ml-4"
      busy={busy}
      onClick={() => {
        setBusy(true)
        void onPress().finally(() => setBusy(false))
      }}
    >
      {children}
    </Button>
  )
}
