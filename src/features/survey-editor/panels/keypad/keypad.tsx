import { Delete } from 'lucide-react'
import { type ReactNode, useId } from 'react'
import type { Length as LengthValue } from '@shared/units/length'
import type { LengthFormat } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { classes } from '@/components/classes'
import { Length } from '@/components/length'
import { lengthFault } from '../length-bounds'
import { type Entry, entryText, type Key, press, readEntry } from './entry'

interface KeypadProps {
  entry: Entry
  onEntry: (entry: Entry) => void
  /** Gets a length that was understood. */
  onEnter: (length: LengthValue) => void
  format: LengthFormat
  /** Finest fraction of the house. */
  fraction: 16 | 32 | 64
  /** What the main key does: `Add top reading`. */
  enterLabel: string
  /** The mean of what was read at this place, with what is keyed in. */
  mean?: string | undefined
  /** What stands beside the figure: where the tape lies. */
  beside?: ReactNode
}

const key =
  'flex min-h-14 min-w-0 items-center justify-center rounded border border-rule bg-paper text-lg font-medium active:bg-chalk-ground'

/** A length by big keys or by keyboard; what was understood stands above, as large as anything near it. */
export function Keypad({ entry, onEntry, onEnter, format, fraction, enterLabel, mean, beside }: KeypadProps) {
  const id = useId()
  const isMetric = format.style === 'millimetres'
  const parsed = readEntry(entry, isMetric ? 'mm' : 'in')
  // A first zero is the beginning of 0.5 or 0 3/8, not yet a length of nothing.
  const isBegun = /^0[.,]?$/.test(entryText(entry))
  const fault = parsed && !isBegun ? (parsed.ok ? lengthFault(parsed.length) : parsed.message) : undefined
  const hit = (pressed: Key) => onEntry(press(entry, pressed))
  const enter = () => {
    if (parsed?.ok && !fault && !isBegun) onEnter(parsed.length)
  }
  return (
    <div className="flex flex-col gap-2">
      <div className="flex flex-wrap items-center justify-between gap-x-3 gap-y-2">
        {beside}
        <div className="ml-auto min-h-10 text-2xl font-semibold" aria-live="polite">
          {parsed?.ok ? (
            <Length value={parsed.length} format={format} />
          ) : (
            <span className="text-soft">—</span>
          )}
        </div>
      </div>
      {mean ? <p className="text-right text-sm text-soft">{mean}</p> : null}
      {fault ? (
        <p id={`${id}-fault`} role="alert" className="text-sm text-stop">
          {fault}
        </p>
      ) : null}
      <div className="flex gap-2">
        <input
          aria-label="Length as written on the tape"
          aria-describedby={fault ? `${id}-fault` : undefined}
          aria-invalid={parsed ? fault !== undefined : undefined}
          className="figures min-h-12 min-w-0 flex-1 rounded border border-rule bg-card px-3 text-lg"
          // The keys below are the keyboard of a phone; a real one types here all the same.
          inputMode="none"
          autoComplete="off"
          value={entryText(entry)}
          onChange={(event) => hit({ key: 'written', text: event.target.value })}
          onKeyDown={(event) => {
            if (event.key === 'Enter') enter()
          }}
        />
        <Button look="primary" disabled={!parsed?.ok || fault !== undefined || isBegun} onClick={enter}>
          {enterLabel}
        </Button>
      </div>
      <div className={classes('grid gap-1', isMetric ? 'grid-cols-3' : 'grid-cols-[3fr_4fr]')}>
        <Digits hit={hit} isMetric={isMetric} />
        {isMetric ? null : <Fractions entry={entry} hit={hit} fraction={fraction} />}
      </div>
    </div>
  )
}

type Hit = (key: Key) => void

function Digits({ hit, isMetric }: { hit: Hit; isMetric: boolean }) {
  const digit = (text: string) => (
    <button key={text} type="button" className={key} onClick={() => hit({ key: 'digit', digit: text })}>
      {text}
    </button>
  )
  return (
    <div className={classes('grid grid-cols-3 gap-1', isMetric && 'col-span-3')}>
      {['7', '8', '9', '4', '5', '6', '1', '2', '3'].map(digit)}
      {isMetric ? (
        <button
          type="button"
          className={key}
          aria-label="decimal point"
          onClick={() => hit({ key: 'point' })}
        >
          .
        </button>
      ) : (
        <button type="button" className={key} aria-label="feet" onClick={() => hit({ key: 'feet' })}>
          ft
        </button>
      )}
      {digit('0')}
      <button
        type="button"
        className={key}
        aria-label="Take back the last key"
        onClick={() => hit({ key: 'back' })}
      >
        <Delete aria-hidden="true" />
      </button>
    </div>
  )
}

/** 1/16 to 15/16 in lowest terms. */
const sixteenths = Array.from({ length: 15 }, (_, i) => i + 1).map((count) => {
  let [numerator, denominator] = [count, 16]
  for (; numerator % 2 === 0; numerator /= 2) denominator /= 2
  return { count, numerator, denominator }
})

function Fractions({ entry, hit, fraction }: { entry: Entry; hit: Hit; fraction: 16 | 32 | 64 }) {
  const chosen = entry.thirtySeconds ?? 0
  const half = (
    <button
      type="button"
      className={classes(key, 'text-sm', chosen % 2 === 1 && 'border-chalk bg-chalk-ground')}
      aria-pressed={chosen % 2 === 1}
      aria-label="and one thirty-second"
      onClick={() => hit({ key: 'half-sixteenth' })}
    >
      +¹⁄₃₂
    </button>
  )
  const clear = (
    <button
      type="button"
      className={classes(key, 'text-sm')}
      onClick={() => hit({ key: 'sixteenths', count: 0 })}
    >
      whole
    </button>
  )
  return (
    <div className="figures grid grid-cols-4 gap-1">
      {sixteenths.map(({ count, numerator, denominator }) => {
        const isChosen = Math.floor(chosen / 2) === count
        return (
          <button
            key={count}
            type="button"
            aria-label={`${numerator}/${denominator} inch`}
            aria-pressed={isChosen}
            className={classes(key, isChosen && 'border-chalk bg-chalk-ground')}
            onClick={() => hit({ key: 'sixteenths', count })}
          >
            <Stacked numerator={numerator} denominator={denominator} />
          </button>
        )
      })}
      {fraction === 16 ? clear : half}
    </div>
  )
}

const Stacked = ({ numerator, denominator }: { numerator: number; denominator: number }): ReactNode => (
  <span aria-hidden="true">
    <sup className="text-[0.75em]">{numerator}</sup>⁄<sub className="text-[0.75em]">{denominator}</sub>
  </span>
)
