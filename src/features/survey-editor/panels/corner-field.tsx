import { TextField } from '@/components/field'
import type { PanelProps } from './selection-panel'

/** The plan angle at a post where bays meet: 90 for a square corner, 180 where the guard goes straight on. */
export function CornerField({ view, actions, post }: PanelProps & { post: string }) {
  const { bays, corners } = view.survey
  const meeting = bays.filter(({ from, to }) => from === post || to === post)
  if (meeting.length < 2) return null
  const known = corners.find((corner) => corner.post === post)
  const keep = (text: string, number: number) => {
    if (text === '' && known) actions.performAndLay({ type: 'corner.remove', post })
    else if (number > 0 && number <= 180 && number !== known?.angle) {
      actions.performAndLay({ type: 'corner.set', corner: { post, angle: number } })
    }
  }
  return (
    <TextField
      key={known?.angle ?? 'none'}
      label="Corner angle between the bays, °"
      hint="90 for a square corner, 180 where the guard goes straight on"
      type="number"
      min={1}
      max={180}
      step="any"
      inputMode="decimal"
      defaultValue={known?.angle ?? ''}
      disabled={!view.canEdit}
      onBlur={(event) => keep(event.target.value, event.target.valueAsNumber)}
    />
  )
}
