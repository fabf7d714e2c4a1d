import type { Survey } from '@shared/schemas/survey'
import type { Gap } from '@shared/survey/find-gaps'
import type { Selection } from './editor-context'

/** The selection, or none when what was selected is gone. */
export function stillThere(survey: Survey, selection: Selection): Selection {
  const has = (list: readonly { id: string }[], id: string) => list.some((item) => item.id === id)
  switch (selection.kind) {
    case 'none':
      return selection
    case 'post':
      return has(survey.posts, selection.id) ? selection : { kind: 'none' }
    case 'bay':
      return has(survey.bays, selection.id) ? selection : { kind: 'none' }
    case 'run':
      return has(survey.runs, selection.id) ? selection : { kind: 'none' }
    case 'photo':
    case 'rectangle':
      return has(survey.photos, selection.id) ? selection : { kind: 'none' }
  }
}

/** Posts and bays of a photo in the order Tab walks them. */
export function walkOrder(survey: Survey, photoId: string | null): Selection[] {
  const marks = survey.photos.find(({ id }) => id === photoId)?.posts ?? {}
  return [
    ...survey.posts.filter(({ id }) => marks[id]).map(({ id }) => ({ kind: 'post' as const, id })),
    ...survey.bays
      .filter(({ from, to }) => marks[from] && marks[to])
      .map(({ id }) => ({ kind: 'bay' as const, id })),
  ]
}

/** The next or previous mark; past the last comes the first. */
export function stepSelection(order: readonly Selection[], selection: Selection, step: 1 | -1): Selection {
  const same = (other: Selection) =>
    other.kind === selection.kind &&
    other.kind !== 'none' &&
    selection.kind !== 'none' &&
    other.id === selection.id
  const at = order.findIndex(same)
  const next = at < 0 ? (step > 0 ? 0 : order.length - 1) : (at + step + order.length) % order.length
  return order[next] ?? { kind: 'none' }
}

/** Where a gap is, as a selection. */
export const selectionOfGap = ({ where: { bay, post } }: Gap): Selection =>
  bay ? { kind: 'bay', id: bay } : post ? { kind: 'post', id: post } : { kind: 'none' }
