import { NumberField } from '@/components/number-field'
import type { PanelProps } from './selection-panel'

/** The plan angle at a post where bays meet: 90 for a square corner, 180 where the guard goes straight on. */
export function CornerField({ view, actions, post }: PanelProps & { post: string }) {
  const { bays, corners } = view.survey
  const meeting = bays.filter(({ from, to }) => from === post || to === post)
  if (meeting.length < 2) return null
  const known = corners.find((corner) => corner.post === post)
  const keep = (angle: number | undefined) => {
    if (angle === known?.angle) return
    actions.performAndLay(
      angle === undefined ? { type: 'corner.remove', post } : { type: 'corner.set', corner: { post, angle } },
    )
  }
  return (
    <NumberField
      label="Corner angle between the bays"
      unit="°"
      hint="90 for a square corner, 180 where the guard goes straight on"
      min={1}
      max={180}
      value={known?.angle}
      disabled={!view.canEdit}
      onChange={keep}
    />
  )
}
