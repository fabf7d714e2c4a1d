import { ANGLE_AGREEMENT, angleDisagreement } from '@shared/calculation/stair-angle'
import type { Bay } from '@shared/schemas/bay'
import { toDegrees } from '@shared/units/angle'
import { writeAngle } from '@shared/units/format-angle'
import type { Length } from '@shared/units/length'
import { ChoiceGroup } from '@/components/choices'
import { FindingItem } from '@/components/finding-mark'
import { NumberField } from '@/components/number-field'
import { formatOf } from './format-of'
import { MeasureField } from './measure-field'
import type { PanelProps } from './selection-panel'

const tapes = [
  { value: 'slope', label: 'Along the slope' },
  { value: 'level', label: 'Level' },
] as const

/** A stair's angle by rise and going, by gauge, or both, and how its bay was taped. */
export function StairFields({ view, actions, bay }: PanelProps & { bay: Bay }) {
  const { canEdit } = view
  const format = formatOf(view)
  const keep = (key: 'rise' | 'going' | 'gauge', value: Length | number | undefined) =>
    actions.perform({
      type: 'bay.set',
      id: bay.id,
      set: value === undefined ? {} : { [key]: value },
      unset: value === undefined ? [key] : [],
    })
  const computed =
    bay.rise !== undefined && bay.going !== undefined ? toDegrees(Math.atan2(bay.rise, bay.going)) : undefined
  const apart = angleDisagreement(bay) ?? 0
  return (
    <div className="flex flex-col gap-3">
      <div className="grid grid-cols-3 gap-3">
        <MeasureField
          label="Rise"
          value={bay.rise}
          format={format}
          disabled={!canEdit}
          onChange={(value) => keep('rise', value)}
        />
        <MeasureField
          label="Going"
          value={bay.going}
          format={format}
          disabled={!canEdit}
          onChange={(value) => keep('going', value)}
        />
        <NumberField
          label="Gauge"
          unit="°"
          min={0}
          max={80}
          value={bay.gauge}
          disabled={!canEdit}
          onChange={(gauge) => {
            if (gauge !== bay.gauge) keep('gauge', gauge)
          }}
        />
      </div>
      {computed === undefined ? null : (
        <p>
          Rise and going make <span className="figures font-medium text-spruce">{writeAngle(computed)}</span>.
        </p>
      )}
      {apart > ANGLE_AGREEMENT ? (
        <FindingItem
          finding={{
            level: 'check',
            text: `Rise and going differ from the gauge by ${writeAngle(toDegrees(apart))}. Rise and going are used; take the doubtful one again.`,
          }}
        />
      ) : null}
      <ChoiceGroup
        label="The tape lay"
        choices={tapes}
        value={bay.taped}
        disabled={!canEdit}
        onChange={(taped) => actions.perform({ type: 'bay.set', id: bay.id, set: { taped }, unset: [] })}
      />
    </div>
  )
}
