import { photoDistance, type PhotoPoint } from '@shared/geometry/point'
import type { Survey } from '@shared/schemas/survey'
import { bayLine, distanceToLine, photoOf, strokesOf } from './marks'

/** What lies under a finger. */
export type Target =
  | { kind: 'post'; id: string; part: 'base' | 'top' | 'stroke' }
  | { kind: 'bay'; id: string }
  | { kind: 'corner'; index: number }

interface Candidate {
  target: Target
  distance: number
}

/** The nearest mark within reach (photo pixels): ends of posts before strokes, posts before bays. */
export function hitTest(
  { survey, photoId }: { survey: Survey; photoId: string | null },
  at: PhotoPoint,
  reach: number,
): Target | undefined {
  const photo = photoOf(survey, photoId)
  const strokes = strokesOf(survey, photo)
  const ends: Candidate[] = []
  const bodies: Candidate[] = []
  for (const [id, { base, top }] of strokes) {
    ends.push({ target: { kind: 'post', id, part: 'base' }, distance: photoDistance(at, base) })
    ends.push({ target: { kind: 'post', id, part: 'top' }, distance: photoDistance(at, top) })
    bodies.push({ target: { kind: 'post', id, part: 'stroke' }, distance: distanceToLine(at, [base, top]) })
  }
  photo?.rectangle?.corners.forEach((corner, index) =>
    ends.push({ target: { kind: 'corner', index }, distance: photoDistance(at, corner) }),
  )
  const bays = survey.bays.flatMap((bay): Candidate[] => {
    const line = bayLine(bay, strokes)
    return line ? [{ target: { kind: 'bay', id: bay.id }, distance: distanceToLine(at, line) }] : []
  })
  return nearest(ends, reach) ?? nearest(bodies, reach) ?? nearest(bays, reach)
}

function nearest(candidates: readonly Candidate[], reach: number): Target | undefined {
  let best: Candidate | undefined
  for (const candidate of candidates) {
    if (candidate.distance <= reach && (!best || candidate.distance < best.distance)) best = candidate
  }
  return best?.target
}
