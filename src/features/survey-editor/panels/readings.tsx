import { useState } from 'react'
import type { Reading, ReadingPlace } from '@shared/schemas/bay'
import type { ReadingOwner } from '@shared/survey/survey-operation'
import { meanOfReadings } from '@shared/calculation/mean-of-readings'
import { type LengthFormat, writeLength } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { ChoiceGroup } from '@/components/choices'
import { FindingItem } from '@/components/finding-mark'
import { TextField } from '@/components/field'
import { Length } from '@/components/length'
import { formatOf } from './format-of'
import { Keypad } from './keypad/keypad'
import { emptyEntry, readEntry } from './keypad/entry'
import { newReading } from './new-reading'
import { readingDoubts } from './reading-doubts'
import type { PanelProps } from './selection-panel'

interface ReadingsProps extends PanelProps {
  of: ReadingOwner
  readings: readonly Reading[]
  /** After a reading that left no place of this bay unread. */
  onComplete?: () => void
}

const places = [
  { value: 'top', label: 'Top' },
  { value: 'bottom', label: 'Bottom' },
] as const

/** The readings of a bay, or overall readings of a run: taken with the keypad, struck with a reason, never changed. */
export function Readings({ view, actions, of, readings, onComplete }: ReadingsProps) {
  const { guard } = view.survey
  const unread = places.find(({ value }) => !meanOfReadings(readings, value))?.value
  const [place, setPlace] = useState<ReadingPlace>(unread ?? 'top')
  const [entry, setEntry] = useState(emptyEntry)
  const format = formatOf(view)
  const typed = readEntry(entry, view.units.length)
  // What is keyed in is doubted before it is taken, not only after.
  const inHand = typed?.ok && typed.length > 0 ? [{ id: 'in-hand', at: place, value: typed.length }] : []
  const doubts = readingDoubts([...readings, ...inHand], view)
  const add = (value: Parameters<typeof newReading>[0]['value']) => {
    const reading = newReading({ at: place, value, by: view.person.name })
    actions.perform({ type: 'reading.add', of, reading })
    setEntry(emptyEntry)
    const other = place === 'top' ? 'bottom' : 'top'
    const isNew = !meanOfReadings(readings, place)
    if (!meanOfReadings(readings, other)) setPlace(other)
    // A doubt that this reading raised is to be seen before going on.
    else if (isNew && readingDoubts([...readings, reading], view).length === 0) onComplete?.()
  }
  return (
    <div className="flex flex-col gap-3">
      {view.canEdit && (
        <Keypad
          entry={entry}
          onEntry={setEntry}
          onEnter={add}
          format={format}
          fraction={view.fraction}
          enterLabel={`Add ${place}`}
          mean={meanText(readings, { place, inHand, format })}
          beside={
            <ChoiceGroup
              label="Where the tape lies"
              quiet
              choices={places.map(({ value, label }) => ({
                value,
                label: (
                  <span>
                    {label} <Length value={guard.readAt[value]} format={format} className="text-sm" />
                  </span>
                ),
              }))}
              value={place}
              onChange={setPlace}
            />
          }
        />
      )}
      {doubts.map((text) => (
        <FindingItem key={text} finding={{ level: 'check', text }} />
      ))}
      <ul aria-label="Readings" className="divide-y divide-rule">
        {readings.map((reading) => (
          <ReadingLine key={reading.id} view={view} actions={actions} of={of} reading={reading} />
        ))}
      </ul>
    </div>
  )
}

/** The mean that the next reading would make, where there is one already. */
function meanText(
  readings: readonly Reading[],
  { place, inHand, format }: { place: ReadingPlace; inHand: readonly Reading[]; format: LengthFormat },
): string | undefined {
  if (!meanOfReadings(readings, place)) return undefined
  const read = meanOfReadings([...readings, ...inHand], place)
  return read && `${place}: mean of ${read.count} is ${writeLength(read.mean, format)}`
}

const dayText = (on: string): string =>
  new Date(on).toLocaleDateString(undefined, { day: 'numeric', month: 'short' })

const reasons = ['digits swapped', 'wrong bay', 'tape sagged', 'misread'] as const

function ReadingLine({ view, actions, of, reading }: PanelProps & { of: ReadingOwner; reading: Reading }) {
  const [striking, setStriking] = useState(false)
  const [reason, setReason] = useState('')
  const strike = (text: string) => {
    actions.perform({ type: 'reading.strike', of, id: reading.id, reason: text })
    setStriking(false)
  }
  const { struck, at, value, by, on } = reading
  return (
    <li className="py-2">
      <div className="flex flex-wrap items-center gap-x-3">
        <span className="text-sm text-soft">{at}</span>
        <Length
          value={value}
          format={formatOf(view)}
          look={struck === undefined ? 'measured' : 'struck'}
          className="text-lg"
        />
        <span className="min-w-0 flex-1 truncate text-sm text-soft">
          {struck ?? [by, on && dayText(on)].filter(Boolean).join(', ')}
        </span>
        {struck === undefined && view.canEdit && (
          <Button look="quiet" aria-expanded={striking} onClick={() => setStriking(!striking)}>
            Strike
          </Button>
        )}
      </div>
      {striking && (
        <div role="group" aria-label="Why is it wrong?" className="flex flex-wrap items-end gap-2 pb-2">
          {reasons.map((text) => (
            <Button key={text} onClick={() => strike(text)}>
              {text}
            </Button>
          ))}
          <TextField
            label="Another reason"
            className="min-w-40 flex-1"
            value={reason}
            maxLength={200}
            onChange={(event) => setReason(event.target.value)}
          />
          <Button disabled={reason.trim() === ''} onClick={() => strike(reason.trim())}>
            Strike it
          </Button>
        </div>
      )}
    </li>
  )
}
