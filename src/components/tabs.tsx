import { Tabs as Radix } from 'radix-ui'
import type { ReactNode } from 'react'

export interface Tab {
  key: string
  label: ReactNode
  content: ReactNode
}

interface TabsProps {
  /** What the tabs divide, for screen readers. */
  label: string
  tabs: readonly Tab[]
  /** The first one unless said. */
  start?: string
}

/** Parts of one thing, one at a time; the arrow keys move between them, the row scrolls inside itself. */
export function Tabs({ label, tabs, start = tabs[0]?.key }: TabsProps) {
  return (
    <Radix.Root defaultValue={start}>
      <Radix.List aria-label={label} className="flex overflow-x-auto border-b border-rule">
        {tabs.map((tab) => (
          <Radix.Trigger
            key={tab.key}
            value={tab.key}
            className="min-h-12 shrink-0 border-b-2 border-transparent px-4 text-soft -outline-offset-2 hover:text-ink data-[state=active]:border-spruce data-[state=active]:font-medium data-[state=active]:text-spruce"
          >
            {tab.label}
          </Radix.Trigger>
        ))}
      </Radix.List>
      {tabs.map((tab) => (
        <Radix.Content key={tab.key} value={tab.key} className="pt-4">
          {tab.content}
        </Radix.Content>
      ))}
    </Radix.Root>
  )
}
