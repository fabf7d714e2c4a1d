import type { Bay, ReadingPlace } from '@shared/schemas/bay'
import { meanOfReadings } from '@shared/calculation/mean-of-readings'
import { removeBays } from '@shared/survey/remove-bay'
import { writeLength } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { Length } from '@/components/length'
import { sayDone } from '@/components/toast'
import { formatOf } from '../panels/format-of'
import { newReading } from '../panels/new-reading'
import type { PanelProps } from '../panels/selection-panel'
import { Cell } from './cell'
import { lengthCommit, numberCommit } from './length-commit'
import { SelectCell } from './select-cell'
import { Sheetlike } from './sheetlike'

const kinds = [
  { value: 'level', label: 'level' },
  { value: 'stair', label: 'stair' },
]
const tapes = [
  { value: 'slope', label: 'along the slope' },
  { value: 'level', label: 'level' },
]

interface BaysTableProps extends PanelProps {
  onPaste: (place: ReadingPlace, row: string, lines: string[]) => void
}

/** Bays and their readings. What is typed beside a place is one more reading; those before it stay. */
export function BaysTable({ view, actions, onPaste }: BaysTableProps) {
  const { survey, canEdit } = view
  const format = formatOf(view)
  const set = (id: string, key: keyof Omit<Bay, 'id' | 'readings'>, value: unknown) =>
    actions.perform({
      type: 'bay.set',
      id,
      set: value === undefined ? {} : { [key]: value },
      unset: value === undefined ? [key] : [],
    })
  const readings = (bay: Bay, at: ReadingPlace) => {
    const read = meanOfReadings(bay.readings, at)
    return (
      <div className="flex items-center gap-2">
        {read ? (
          <span className="whitespace-nowrap pl-2">
            <Length value={read.mean} format={format} />
            {read.count > 1 ? <span className="text-sm text-soft"> of {read.count}</span> : null}
          </span>
        ) : null}
        {canEdit ? (
          <Cell
            label={`Add a ${at} reading to ${bay.id}`}
            value=""
            onCommit={lengthCommit(view, (value) => {
              if (value === undefined) return
              const reading = newReading({ at, value, by: view.person.name })
              actions.perform({ type: 'reading.add', of: { kind: 'bay', id: bay.id }, reading })
            })}
            onPasteLines={(lines) => onPaste(at, bay.id, lines)}
          />
        ) : null}
      </div>
    )
  }
  const stairLength = (bay: Bay, key: 'rise' | 'going', label: string) => (
    <Cell
      label={`${label} of ${bay.id}`}
      value={bay[key] === undefined ? '' : writeLength(bay[key], format)}
      readOnly={!canEdit}
      onCommit={lengthCommit(view, (value) => set(bay.id, key, value))}
    />
  )
  const remove = (id: string) => {
    actions.perform(removeBays(survey, [id]))
    sayDone(`Bay ${id} removed.`, actions.undo)
  }
  return (
    <Sheetlike
      caption="Bays and readings"
      headers={[
        'Bay',
        'From',
        'To',
        'Top',
        'Bottom',
        'Kind',
        'Rise',
        'Going',
        'Gauge, °',
        'Taped',
        'Spacers',
        '',
      ]}
    >
      {survey.bays.map((bay) => (
        <tr key={bay.id} className="border-b border-rule last:border-0">
          <th scope="row" className="px-3 text-left font-medium">
            <Button
              look="quiet"
              aria-label={`Readings of ${bay.id}`}
              onClick={() => actions.select({ kind: 'bay', id: bay.id })}
            >
              {bay.id}
            </Button>
          </th>
          <td className="px-3">{bay.from}</td>
          <td className="px-3">{bay.to}</td>
          <td>{readings(bay, 'top')}</td>
          <td>{readings(bay, 'bottom')}</td>
          <td>
            <SelectCell
              label={`Kind of ${bay.id}`}
              value={bay.kind}
              choices={kinds}
              disabled={!canEdit}
              onChange={(value) =>
                actions.performAndLay({
                  type: 'bay.set',
                  id: bay.id,
                  set: { kind: value === 'stair' ? 'stair' : 'level' },
                  unset: [],
                })
              }
            />
          </td>
          {bay.kind === 'stair' ? (
            <>
              <td>{stairLength(bay, 'rise', 'Rise')}</td>
              <td>{stairLength(bay, 'going', 'Going')}</td>
              <td>
                <Cell
                  label={`Gauge of ${bay.id}`}
                  value={bay.gauge === undefined ? '' : String(bay.gauge)}
                  readOnly={!canEdit}
                  onCommit={numberCommit([0, 80], (value) => set(bay.id, 'gauge', value))}
                />
              </td>
              <td>
                <SelectCell
                  label={`How ${bay.id} was taped`}
                  value={bay.taped}
                  choices={tapes}
                  disabled={!canEdit}
                  onChange={(value) => set(bay.id, 'taped', value)}
                />
              </td>
            </>
          ) : (
            <td colSpan={4} />
          )}
          <td>
            <Cell
              label={`Spacers of ${bay.id}`}
              value={String(bay.spacers)}
              readOnly={!canEdit}
              onCommit={numberCommit([0, 50], (value) => set(bay.id, 'spacers', Math.round(value ?? 0)))}
            />
          </td>
          <td>
            {canEdit ? (
              <Button look="quiet" aria-label={`Remove bay ${bay.id}`} onClick={() => remove(bay.id)}>
                Remove
              </Button>
            ) : null}
          </td>
        </tr>
      ))}
    </Sheetlike>
  )
}
