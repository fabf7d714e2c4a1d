import type { PanelProps } from '../panels/selection-panel'
import { Cell } from './cell'
import { numberCommit } from './length-commit'
import { Sheetlike } from './sheetlike'

/** The plan angle at every post where bays meet. */
export function CornersTable({ view, actions }: PanelProps) {
  const { survey, canEdit } = view
  const meeting = survey.posts.filter(
    ({ id }) => survey.bays.filter(({ from, to }) => from === id || to === id).length > 1,
  )
  if (meeting.length === 0) return <p className="text-soft">No bays meet at a post yet.</p>
  const set = (post: string, angle: number | undefined, known: boolean) => {
    if (angle !== undefined) actions.performAndLay({ type: 'corner.set', corner: { post, angle } })
    else if (known) actions.performAndLay({ type: 'corner.remove', post })
  }
  return (
    <Sheetlike caption="Corners" headers={['Post', 'Angle between its bays, °']}>
      {meeting.map(({ id }) => {
        const known = survey.corners.find(({ post }) => post === id)
        return (
          <tr key={id} className="border-b border-rule last:border-0">
            <th scope="row" className="px-3 text-left font-medium">
              {id}
            </th>
            <td>
              <Cell
                label={`Corner angle at ${id}`}
                value={known ? String(known.angle) : ''}
                readOnly={!canEdit}
                onCommit={numberCommit([1, 180], (angle) => set(id, angle, known !== undefined))}
              />
            </td>
          </tr>
        )
      })}
    </Sheetlike>
  )
}
