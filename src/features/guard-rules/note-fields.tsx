import { basisWords } from '@shared/calculation/guard-rules/published-rules'
import type { GuardRules } from '@shared/schemas/guard-rules'
import { Button } from '@/components/button'
import { TextArea, TextField } from '@/components/field'
import { Card } from '@/components/page'
import { refusalAt } from '@/lib/refusal'
import { sectionAllowed } from './figure-field'

type Note = GuardRules['notes'][number]

interface NoteFieldsProps {
  notes: readonly Note[]
  error: unknown
  onChange: (notes: Note[]) => void
}

/** As many as one set of rules may hold. */
const MOST = 30

/** What the rules say besides, for people to read. */
export function NoteFields({ notes, error, onChange }: NoteFieldsProps) {
  const change = (place: number, fields: Partial<Note>) =>
    onChange(notes.map((note, i) => (i === place ? { ...note, ...fields, basis: 'own' } : note)))
  const add = () => onChange([...notes, { text: '', section: 'own rule', basis: 'own' }])
  return (
    <Card title="They also say">
      <ul className="flex flex-col gap-4">
        {notes.map((note, i) => (
          <li key={i} className="flex flex-col gap-2 border-b border-rule pb-3">
            <TextArea
              label={`Note ${i + 1}`}
              rows={3}
              required
              maxLength={400}
              value={note.text}
              error={refusalAt(error, `notes.${i}.text`, 'Write what the rules say, or remove the note.')}
              onChange={(event) => change(i, { text: event.target.value })}
            />
            <TextField
              label="Section"
              aria-label={`Section of: note ${i + 1}`}
              hint={basisWords[note.basis]}
              maxLength={120}
              value={note.section}
              error={refusalAt(error, `notes.${i}.section`, sectionAllowed)}
              onChange={(event) => change(i, { section: event.target.value })}
            />
            <Button look="quiet" className="self-start" onClick={() => onChange(notes.toSpliced(i, 1))}>
              Remove note {i + 1}
            </Button>
          </li>
        ))}
      </ul>
      {notes.length < MOST ? (
        <Button className="mt-3" onClick={add}>
          Add a note
        </Button>
      ) : null}
    </Card>
  )
}
