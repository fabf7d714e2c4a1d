import type { LengthFormat } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { Length } from '@/components/length'
import type { PastedLine } from './paste'

interface PastePreviewProps {
  lines: readonly PastedLine[]
  format: LengthFormat
  onApply: () => void
  onDrop: () => void
}

/** What a pasted column would become; nothing is taken over before it is said to be right. */
export function PastePreview({ lines, format, onApply, onDrop }: PastePreviewProps) {
  const understood = lines.filter(({ length }) => length !== undefined).length
  return (
    <div className="flex flex-col gap-4">
      <ul className="divide-y divide-rule">
        {lines.map(({ row, text, length, fault }, i) => (
          <li key={`${row} ${i}`} className="flex flex-wrap items-baseline gap-3 py-2">
            <span className="w-12 font-medium">{row || '—'}</span>
            <span className="figures">{text}</span>
            {length === undefined ? (
              <span className="text-sm text-stop">{fault}</span>
            ) : (
              <Length value={length} format={format} className="ml-auto text-lg" />
            )}
          </li>
        ))}
      </ul>
      <div className="flex flex-wrap gap-2">
        <Button look="primary" disabled={understood === 0} onClick={onApply}>
          Take over {understood} of {lines.length}
        </Button>
        <Button onClick={onDrop}>Leave it</Button>
      </div>
    </div>
  )
}
