import { photoDistance, type PhotoPoint } from '@shared/geometry/point'
import type { Bay } from '@shared/schemas/bay'
import type { Photo, PostMark } from '@shared/schemas/photo'
import type { Survey } from '@shared/schemas/survey'
import type { Selection } from './editor-context'

/** A post's stroke with both ends; a mark without a top stands up by a guess. */
export interface Stroke {
  base: PhotoPoint
  top: PhotoPoint
}

export const photoOf = (survey: Survey, photoId: string | null): Photo | undefined =>
  survey.photos.find(({ id }) => id === photoId)

/** Strokes of a photo by post, in the order of the survey's posts. */
export function strokesOf(survey: Survey, photo: Photo | undefined): Map<string, Stroke> {
  const strokes = new Map<string, Stroke>()
  if (!photo) return strokes
  for (const { id } of survey.posts) {
    const mark = photo.posts[id]
    if (mark)
      strokes.set(id, { base: mark.base, top: mark.top ?? guessTop(mark.base, Object.values(photo.posts)) })
  }
  return strokes
}

/** What a first post is given where no other says how tall posts look: a seventh of what is seen. */
const FIRST_HEIGHT = 260

/**
 * Where a post's top probably is: posts look taller the nearer they stand, so the height follows how far down the
 * picture the base is, by the two posts nearest in that.
 */
export function guessTop(base: PhotoPoint, known: readonly PostMark[]): PhotoPoint {
  const near = known
    .flatMap(({ base: [x, y], top }) => (top ? [{ y, dx: top[0] - x, dy: top[1] - y }] : []))
    .sort((a, b) => Math.abs(a.y - base[1]) - Math.abs(b.y - base[1]))
    .slice(0, 2)
  const [first, second] = near
  if (!first) return [base[0], base[1] - FIRST_HEIGHT]
  const span = second ? second.y - first.y : 0
  const share = second && Math.abs(span) > 1 ? Math.min(1.5, Math.max(-0.5, (base[1] - first.y) / span)) : 0
  const between = (a: number, b: number) => a + (b - a) * share
  return [
    base[0] + between(first.dx, second?.dx ?? first.dx),
    base[1] + between(first.dy, second?.dy ?? first.dy),
  ]
}

const middle = ({ base, top }: Stroke): PhotoPoint => [(base[0] + top[0]) / 2, (base[1] + top[1]) / 2]

/** A bay's line, at mid-height from post to post; none where either post is not marked on this photo. */
export function bayLine(
  bay: Bay,
  strokes: ReadonlyMap<string, Stroke>,
): readonly [PhotoPoint, PhotoPoint] | undefined {
  const from = strokes.get(bay.from)
  const to = strokes.get(bay.to)
  return from && to ? [middle(from), middle(to)] : undefined
}

/** Distance in pixels from a place to a line between two others. */
export function distanceToLine(at: PhotoPoint, [a, b]: readonly [PhotoPoint, PhotoPoint]): number {
  const length = photoDistance(a, b)
  if (length === 0) return photoDistance(at, a)
  const along = ((at[0] - a[0]) * (b[0] - a[0]) + (at[1] - a[1]) * (b[1] - a[1])) / length ** 2
  const share = Math.min(1, Math.max(0, along))
  return photoDistance(at, [a[0] + (b[0] - a[0]) * share, a[1] + (b[1] - a[1]) * share])
}

/** Posts of the survey that are not marked on this photo yet. */
export const unplacedPosts = (survey: Survey, photo: Photo | undefined): string[] =>
  survey.posts.flatMap(({ id }) => (photo?.posts[id] ? [] : [id]))

/** The middle of a selected post or bay on a photo; none where it is not marked there. */
export function placeOfSelection(
  survey: Survey,
  photoId: string,
  selection: Selection,
): PhotoPoint | undefined {
  if (selection.kind !== 'post' && selection.kind !== 'bay') return undefined
  const strokes = strokesOf(survey, photoOf(survey, photoId))
  if (selection.kind === 'post') {
    const stroke = strokes.get(selection.id)
    return stroke && middle(stroke)
  }
  const bay = survey.bays.find(({ id }) => id === selection.id)
  const line = bay && bayLine(bay, strokes)
  return line && middle({ base: line[0], top: line[1] })
}
