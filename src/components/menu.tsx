import { DropdownMenu } from 'radix-ui'
import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'

interface MenuProps {
  /** The button that opens it. */
  trigger: ReactNode
  children: ReactNode
}

export function Menu({ trigger, children }: MenuProps) {
  return (
    <DropdownMenu.Root modal={false}>
      <DropdownMenu.Trigger asChild>{trigger}</DropdownMenu.Trigger>
      <DropdownMenu.Portal>
        <DropdownMenu.Content
          align="end"
          sideOffset={6}
          collisionPadding={8}
          // A notice that goes away gives the focus back to where it was; that is no wish to close the menu.
          onFocusOutside={(event) => event.preventDefault()}
          className="z-50 min-w-56 rounded border border-rule bg-card p-1 shadow-float"
        >
          {children}
        </DropdownMenu.Content>
      </DropdownMenu.Portal>
    </DropdownMenu.Root>
  )
}

const item =
  'flex min-h-12 w-full items-center gap-3 rounded px-3 text-base outline-none data-highlighted:bg-chalk-ground data-disabled:opacity-50'

export function MenuItem({
  onSelect,
  children,
  disabled,
}: {
  onSelect: () => void
  children: ReactNode
  disabled?: boolean
}) {
  return (
    <DropdownMenu.Item className={item} onSelect={onSelect} disabled={disabled}>
      {children}
    </DropdownMenu.Item>
  )
}

export function MenuLink({ to, children }: { to: string; children: ReactNode }) {
  return (
    <DropdownMenu.Item asChild className={item}>
      <Link to={to}>{children}</Link>
    </DropdownMenu.Item>
  )
}

export function MenuLabel({ children }: { children: ReactNode }) {
  return <DropdownMenu.Label className="px-3 py-2 text-sm text-soft">{children}</DropdownMenu.Label>
}
