import { useState } from 'react'
import { Button } from '@/components/button'
import { TextField } from '@/components/field'

/** A one-time link, to be handed over; it is shown this once. */
export function OneTimeLink({ name, link, expires }: { name: string; link: string; expires: string }) {
  const [copied, setCopied] = useState(false)
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(link)
      setCopied(true)
    } catch {
      setCopied(false)
    }
  }
  return (
    <div role="status" className="flex flex-col gap-3 rounded border border-spruce bg-card p-4">
      <p>
        Hand this link to {name}. It works once, until {new Date(expires).toLocaleDateString()}, and is not
        shown again.
      </p>
      <div className="flex items-end gap-2">
        <TextField
          label="One-time link"
          className="flex-1"
          value={link}
          readOnly
          onFocus={(event) => event.target.select()}
        />
        <Button onClick={() => void copy()}>{copied ? 'Copied' : 'Copy'}</Button>
      </div>
    </div>
  )
}
