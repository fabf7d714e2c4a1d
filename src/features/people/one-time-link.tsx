import { useRef, useState } from 'react'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'
import { dateText } from '@/lib/date-text'

/** Copies what is marked; for pages that are not served over https, where browsers have no newer way. */
const copyMarked = (): boolean => document.execCommand('copy')

/** A one-time link, to be handed over; it is shown this once. */
export function OneTimeLink({ name, link, expires }: { name: string; link: string; expires: string }) {
  const [copied, setCopied] = useState<boolean>()
  const field = useRef<HTMLInputElement>(null)
  const copy = async () => {
    field.current?.focus()
    field.current?.select()
    try {
      await navigator.clipboard.writeText(link)
      setCopied(true)
    } catch {
      setCopied(copyMarked())
    }
  }
  return (
    <div className="flex flex-col gap-3 rounded border border-spruce bg-card p-4">
      <p role="status">
        Hand this link to {name}; with it they choose their password. It works once, until {dateText(expires)}
        , and is not shown again.
      </p>
      <TextField
        ref={field}
        label="One-time link"
        value={link}
        readOnly
        onFocus={(event) => event.target.select()}
      />
      <Button onClick={() => void copy()}>Copy the link</Button>
      <p role="status" className="text-sm text-soft">
        {copied === true ? 'Copied.' : ''}
        {copied === false ? 'This browser does not copy by itself. The link is marked: copy it by hand.' : ''}
      </p>
    </div>
  )
}
