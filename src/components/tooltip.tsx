import { Tooltip as Radix } from 'radix-ui'
import type { ReactElement } from 'react'

interface TooltipProps {
  /** What it adds; whoever cannot hover must not need it. */
  text: string
  /** Something that can be focused. */
  children: ReactElement
}

/** A word more on hover and on focus, beside what is already said: never the only place for anything. */
export function Tooltip({ text, children }: TooltipProps) {
  return (
    <Radix.Provider delayDuration={400}>
      <Radix.Root>
        <Radix.Trigger asChild>{children}</Radix.Trigger>
        <Radix.Portal>
          <Radix.Content
            sideOffset={6}
            collisionPadding={8}
            className="z-50 max-w-64 rounded border border-rule bg-card px-3 py-2 text-sm text-ink shadow-float"
          >
            {text}
          </Radix.Content>
        </Radix.Portal>
      </Radix.Root>
    </Radix.Provider>
  )
}
