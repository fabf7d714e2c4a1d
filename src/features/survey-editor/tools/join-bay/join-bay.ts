import { newBay } from '@shared/survey/new-bay'
import { nextId } from '@shared/survey/next-id'
import type { ToolHost } from '../tool'

/** Joins two posts by a bay and lays runs for it, in one change; two posts that are joined already select their bay. */
export function joinBay(host: ToolHost, from: string, to: string): void {
  const { survey } = host.state
  const known = survey.bays.find(
    (bay) => (bay.from === from && bay.to === to) || (bay.from === to && bay.to === from),
  )
  if (known) {
    host.select({ kind: 'bay', id: known.id })
    return
  }
  const bay = newBay({
    id: nextId(
      survey.bays.map(({ id }) => id),
      'B',
    ),
    from,
    to,
  })
  host.performAndLay({ type: 'bay.add', bay })
  host.select({ kind: 'bay', id: bay.id })
}
