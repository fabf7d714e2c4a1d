import { useState } from 'react'
import { nextId } from '@shared/survey/next-id'
import { writeLength } from '@shared/units/format-length'
import type { Length } from '@shared/units/length'
import { Button } from '@/components/button'
import { SelectField } from '@/components/field'
import { LengthField } from '@/components/length-field'
import { formatOf } from '../panels/format-of'
import type { PanelProps } from '../panels/selection-panel'

/** Diagonals from post centre to post centre. */
export function Diagonals({ view, actions }: PanelProps) {
  const { survey, canEdit } = view
  const [from, setFrom] = useState('')
  const [to, setTo] = useState('')
  const [value, setValue] = useState<Length>()
  const ready = from !== '' && to !== '' && from !== to && value !== undefined && value > 0
  const add = () => {
    if (!ready) return
    const id = nextId(
      survey.diagonals.map((diagonal) => diagonal.id),
      'D',
    )
    actions.perform({ type: 'diagonal.add', diagonal: { id, from, to, value } })
    setValue(undefined)
  }
  const posts = [
    <option key="" value="">
      —
    </option>,
    ...survey.posts.map(({ id }) => <option key={id}>{id}</option>),
  ]
  return (
    <div className="flex flex-col gap-3">
      <ul className="divide-y divide-rule">
        {survey.diagonals.map((diagonal) => (
          <li key={diagonal.id} className="figures flex items-center justify-between gap-3">
            {diagonal.id}: {diagonal.from} to {diagonal.to}, {writeLength(diagonal.value, formatOf(view))}
            {canEdit ? (
              <Button
                look="quiet"
                aria-label={`Remove diagonal ${diagonal.id}`}
                onClick={() => actions.perform({ type: 'diagonal.remove', id: diagonal.id })}
              >
                Remove
              </Button>
            ) : null}
          </li>
        ))}
      </ul>
      {canEdit ? (
        <div className="grid grid-cols-2 items-end gap-3 md:grid-cols-4">
          <SelectField label="From post" value={from} onChange={(event) => setFrom(event.target.value)}>
            {posts}
          </SelectField>
          <SelectField label="To post" value={to} onChange={(event) => setTo(event.target.value)}>
            {posts}
          </SelectField>
          <LengthField label="Centre to centre" value={value} onChange={setValue} format={formatOf(view)} />
          <Button disabled={!ready} onClick={add}>
            Add diagonal
          </Button>
        </div>
      ) : null}
    </div>
  )
}
