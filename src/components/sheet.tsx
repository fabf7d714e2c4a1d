import { X } from 'lucide-react'
import { Dialog } from 'radix-ui'
import { type ReactNode, useRef } from 'react'
import { IconButton } from './button'
import { classes } from './classes'

interface SheetProps {
  open: boolean
  onOpenChange: (open: boolean) => void
  title: string
  /** One sentence below the title. */
  description?: string
  children: ReactNode
  /** `side` comes from the bottom on a phone and stands at the right on a desk; `middle` is for a question. */
  place?: 'side' | 'middle'
}

const places = {
  side: 'inset-x-0 bottom-0 max-h-[88dvh] rounded-t md:inset-y-0 md:left-auto md:right-0 md:max-h-none md:w-[28rem] md:rounded-none',
  middle: 'inset-x-4 top-[12dvh] mx-auto max-h-[76dvh] max-w-lg rounded',
}

/** A sheet laid over the page; Escape and the cross put it away. */
export function Sheet({ open, onOpenChange, title, description, children, place = 'side' }: SheetProps) {
  // Sheets are opened from anywhere, so the dialog knows no button of its own to go back to.
  const cameFrom = useRef<Element | null>(null)
  return (
    <Dialog.Root open={open} onOpenChange={onOpenChange}>
      <Dialog.Portal>
        <Dialog.Overlay className="fixed inset-0 z-40 bg-shade" />
        <Dialog.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          onOpenAutoFocus={() => {
            cameFrom.current = document.activeElement
          }}
          onCloseAutoFocus={(event) => {
            if (!(cameFrom.current instanceof HTMLElement) || !cameFrom.current.isConnected) return
            event.preventDefault()
            cameFrom.current.focus()
          }}
          className={classes(
            'fixed z-50 flex flex-col overflow-y-auto border border-rule bg-card shadow-float',
            'motion-safe:animate-[rise_0.15s_ease-out]',
            places[place],
          )}
        >
          <div className="sticky top-0 z-10 flex items-start justify-between gap-2 border-b border-rule bg-card p-3 pl-4">
            <div className="min-w-0 py-2">
              <Dialog.Title className="text-lg font-semibold">{title}</Dialog.Title>
              {description ? (
                <Dialog.Description className="text-sm text-soft">{description}</Dialog.Description>
              ) : null}
            </div>
            <Dialog.Close asChild>
              <IconButton label="Close">
                <X aria-hidden="true" />
              </IconButton>
            </Dialog.Close>
          </div>
          <div className="p-4">{children}</div>
        </Dialog.Content>
      </Dialog.Portal>
    </Dialog.Root>
  )
}
