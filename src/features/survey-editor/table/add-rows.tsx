import { useState } from 'react'
import { newBay } from '@shared/survey/new-bay'
import { nextId } from '@shared/survey/next-id'
import { Button } from '@/components/button'
import { SelectField } from '@/components/field'
import type { PanelProps } from '../panels/selection-panel'

const idsOf = (list: readonly { id: string }[]): string[] => list.map(({ id }) => id)

/** Adds posts and bays by name, so that a survey can be made without a photo. */
export function AddRows({ view, actions }: PanelProps) {
  const { survey } = view
  const last = survey.posts.at(-1)?.id ?? ''
  const before = survey.posts.at(-2)?.id ?? ''
  const [from, setFrom] = useState<string>()
  const [to, setTo] = useState<string>()
  const [start, end] = [from ?? before, to ?? last]
  const joined = survey.bays.some(
    (bay) => [bay.from, bay.to].includes(start) && [bay.from, bay.to].includes(end),
  )
  const ready = start !== '' && end !== '' && start !== end && !joined
  const addBay = () => {
    const bay = newBay({ id: nextId(idsOf(survey.bays), 'B'), from: start, to: end })
    actions.performAndLay({ type: 'bay.add', bay })
    setFrom(undefined)
    setTo(undefined)
  }
  const posts = survey.posts.map(({ id }) => <option key={id}>{id}</option>)
  return (
    <div className="grid grid-cols-2 items-end gap-3 md:grid-cols-4">
      <Button
        className="col-span-2 md:col-span-1"
        onClick={() => actions.perform({ type: 'post.add', post: { id: nextId(idsOf(survey.posts), 'P') } })}
      >
        Add post
      </Button>
      <SelectField label="Bay from" value={start} onChange={(event) => setFrom(event.target.value)}>
        {posts}
      </SelectField>
      <SelectField label="to" value={end} onChange={(event) => setTo(event.target.value)}>
        {posts}
      </SelectField>
      <Button className="col-span-2 md:col-span-1" disabled={!ready} onClick={addBay}>
        Add bay
      </Button>
    </div>
  )
}
