import { type Stage, stages } from '@shared/schemas/job'

const sorts = ['updated', 'due', 'number'] as const
export type JobSort = (typeof sorts)[number]

/** What the jobs list shows, as its address says it. */
export interface JobView {
  search: string
  stage: Stage | ''
  /** The person the jobs are with. */
  with: string
  sort: JobSort
}

/** Reads the address; what it says that is no stage or no order is passed over. */
export function readJobAddress(address: URLSearchParams): JobView {
  const stage = address.get('stage')
  const sort = address.get('sort')
  return {
    search: (address.get('search') ?? '').slice(0, 120),
    stage: stages.find((known) => known === stage) ?? '',
    with: address.get('with') ?? '',
    sort: sorts.find((known) => known === sort) ?? 'updated',
  }
}

/** The address after one change; what is as usual is not written. */
export function changeJobAddress(
  address: URLSearchParams,
  name: keyof JobView,
  value: string,
): URLSearchParams {
  const changed = new URLSearchParams(address)
  if (value === '' || (name === 'sort' && value === 'updated')) changed.delete(name)
  else changed.set(name, value)
  return changed
}

/** Whether the list leaves anything out. */
export const isFiltered = (view: JobView): boolean =>
  view.search !== '' || view.stage !== '' || view.with !== ''
