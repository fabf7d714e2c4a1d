import { useRef, useState } from 'react'
import { classes } from '@/components/classes'

interface CellProps {
  /** What the cell is, for everybody who does not see its row and column. */
  label: string
  value: string
  /** Reads what was written; answers a sentence when it cannot. */
  onCommit: (text: string) => string | undefined
  readOnly?: boolean
  /** Several lines pasted at once, for the rows from here on. */
  onPasteLines?: (lines: string[]) => void
}

/** Neighbours of a cell, by the arrow pressed. */
function moveFocus(from: HTMLElement, rows: number): void {
  const cell = from.closest('td')
  const row = cell?.parentElement
  const index = cell && row ? [...row.children].indexOf(cell) : -1
  const next = rows > 0 ? row?.nextElementSibling : row?.previousElementSibling
  next?.children[index]?.querySelector<HTMLElement>('input, select')?.focus()
}

/** A cell that is typed into: Enter keeps and goes down, Escape puts back, arrows up and down go between rows. */
export function Cell({ label, value, onCommit, readOnly = false, onPasteLines }: CellProps) {
  const [text, setText] = useState<string | null>(null)
  const [fault, setFault] = useState<string>()
  // Enter commits and moves on, and leaving the cell commits too: what was kept once must not be kept twice.
  const pending = useRef<string | null>(null)
  const write = (written: string | null) => {
    pending.current = written
    setText(written)
  }
  const commit = (): boolean => {
    const text = pending.current
    if (text === null || text.trim() === value) {
      write(null)
      setFault(undefined)
      return true
    }
    const wrong = onCommit(text.trim())
    setFault(wrong)
    if (wrong === undefined) write(null)
    return wrong === undefined
  }
  return (
    <>
      <input
        aria-label={label}
        aria-invalid={fault !== undefined}
        title={fault}
        readOnly={readOnly}
        className={classes(
          'figures min-h-12 w-full min-w-20 rounded border bg-card px-2',
          fault ? 'border-stop' : readOnly ? 'border-transparent' : 'border-rule focus:border-chalk',
        )}
        value={text ?? value}
        onChange={(event) => write(event.target.value)}
        onFocus={(event) => event.target.select()}
        onBlur={commit}
        onPaste={(event) => {
          const lines = event.clipboardData.getData('text').trimEnd().split(/\r?\n/)
          if (lines.length < 2 || !onPasteLines) return
          event.preventDefault()
          onPasteLines(lines)
        }}
        onKeyDown={(event) => {
          if (event.key === 'Enter' && commit()) moveFocus(event.currentTarget, 1)
          if (event.key === 'Escape') {
            write(null)
            setFault(undefined)
          }
          if (event.key === 'ArrowDown') moveFocus(event.currentTarget, 1)
          if (event.key === 'ArrowUp') moveFocus(event.currentTarget, -1)
        }}
      />
      {fault ? (
        <span role="alert" className="block text-sm text-stop">
          {fault}
        </span>
      ) : null}
    </>
  )
}
