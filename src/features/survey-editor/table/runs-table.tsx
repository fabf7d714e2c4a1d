import { writeLength } from '@shared/units/format-length'
import { Button } from '@/components/button'
import { formatOf } from '../panels/format-of'
import type { PanelProps } from '../panels/selection-panel'
import { SelectCell } from './select-cell'
import { Sheetlike } from './sheetlike'

/** Runs with their cable and layout; the rest of a run is in its panel. */
export function RunsTable({ view, actions }: PanelProps) {
  const { survey, canEdit, hardware } = view
  const cables = hardware.cables.map(({ id, name }) => ({ value: id, label: name }))
  return (
    <Sheetlike caption="Runs" headers={['Run', 'Bays', 'Cable', 'Layout']}>
      {survey.runs.map((run) => (
        <tr key={run.id} className="border-b border-rule last:border-0">
          <th scope="row" className="text-left font-medium">
            <Button
              look="quiet"
              aria-label={`Open run ${run.id}`}
              onClick={() => actions.select({ kind: 'run', id: run.id })}
            >
              {run.id}
            </Button>
          </th>
          <td className="px-3">{run.bays.join(', ')}</td>
          <td>
            <SelectCell
              label={`Cable of ${run.id}`}
              value={run.cable}
              choices={cables}
              disabled={!canEdit}
              onChange={(cable) =>
                actions.perform({ type: 'run.set', id: run.id, set: { cable }, unset: [] })
              }
            />
          </td>
          <td className="px-3">
            {'layout' in run.cables
              ? `${run.cables.layout}, at most ${writeLength(run.cables.spacing, formatOf(view))}`
              : `at ${run.cables.heights.length} heights`}
          </td>
        </tr>
      ))}
    </Sheetlike>
  )
}
