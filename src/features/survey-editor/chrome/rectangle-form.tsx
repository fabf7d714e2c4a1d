import { useState } from 'react'
import type { Photo } from '@shared/schemas/photo'
import type { PhotoPoint } from '@shared/geometry/point'
import type { Length } from '@shared/units/length'
import type { LengthFormat } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { LengthField } from '@/components/length-field'
import type { EditorActions } from '../model/editor-context'

interface RectangleFormProps {
  photo: Photo
  /** Four corners just marked, not yet part of the survey. */
  marked: readonly PhotoPoint[] | null
  format: LengthFormat
  actions: EditorActions
  canEdit: boolean
  onDone: () => void
}

/** Width and depth of the marked rectangle; with both the marks become part of the survey. */
export function RectangleForm({ photo, marked, format, actions, canEdit, onDone }: RectangleFormProps) {
  const [width, setWidth] = useState<Length | undefined>(photo.rectangle?.width)
  const [depth, setDepth] = useState<Length | undefined>(photo.rectangle?.depth)
  const [a, b, c, d] = marked ?? photo.rectangle?.corners ?? []
  if (!a || !b || !c || !d) return null
  const ready = width !== undefined && depth !== undefined && width > 0 && depth > 0
  const save = () => {
    if (!ready) return
    actions.perform({
      type: 'photo.setRectangle',
      photo: photo.id,
      rectangle: { width, depth, corners: [a, b, c, d] },
    })
    onDone()
  }
  const remove = () => {
    if (photo.rectangle) actions.perform({ type: 'photo.clearRectangle', photo: photo.id })
    onDone()
  }
  return (
    <section aria-label="Rectangle" className="flex flex-col gap-3">
      <h2 className="text-lg font-semibold">Rectangle of known size</h2>
      <p className="text-sm text-soft">
        Measure a flat rectangle on the deck: width along its near side, depth away from you. It lets the
        photo check the tape.
      </p>
      <div className="grid grid-cols-2 gap-3">
        <LengthField label="Width" value={width} onChange={setWidth} format={format} disabled={!canEdit} />
        <LengthField label="Depth" value={depth} onChange={setDepth} format={format} disabled={!canEdit} />
      </div>
      {canEdit && (
        <div className="flex flex-wrap gap-2">
          <Button look="primary" onClick={save} disabled={!ready}>
            Keep rectangle
          </Button>
          <Button look="quiet" onClick={remove}>
            {photo.rectangle && !marked ? 'Remove rectangle' : 'Drop it'}
          </Button>
        </div>
      )}
    </section>
  )
}
