import type { Bay } from '@shared/schemas/bay'
import type { Finding, FindingLevel } from '@shared/schemas/finding'
import type { Survey } from '@shared/schemas/survey'
import { meanOfReadings } from '@shared/calculation/mean-of-readings'
import { overrulingOf } from '@shared/survey/overrule'
import { type LengthFormat, writeLength } from '@shared/units/format-length'

/** What stands beside a bay or a post on the photo. */
export interface Caption {
  text: string
  /** Nothing has been read yet: the line is dashed and the length is a question mark. */
  missing: boolean
  level: FindingLevel | null
}

export interface Captions {
  bays: ReadonlyMap<string, Caption>
  posts: ReadonlyMap<string, FindingLevel>
}

const missing: ReadonlySet<string> = new Set([
  'missing-reading',
  'missing-material',
  'missing-angle',
  'missing-size',
  'missing-cover',
])

const weight: Record<FindingLevel, number> = { note: 0, check: 1, stop: 2 }
const graver = (a: FindingLevel | null | undefined, b: FindingLevel): FindingLevel =>
  a && weight[a] >= weight[b] ? a : b

/** The lengths and findings that the photo shows, by bay and post. A bay read in two places shows the top. */
export function captionsOf(survey: Survey, findings: readonly Finding[], format: LengthFormat): Captions {
  const ofBays = new Map<string, FindingLevel>()
  const posts = new Map<string, FindingLevel>()
  for (const finding of findings) {
    const { level, where, code } = finding
    // What is only missing yet shows as a dashed line or in *next missing*; a shape is for what is to be looked at.
    if (missing.has(code) || level === 'note') continue
    // A stop that was let pass as it is calls nobody any more.
    if (overrulingOf(survey, finding)?.stands) continue
    if (where.bay) ofBays.set(where.bay, graver(ofBays.get(where.bay), level))
    else if (where.post) posts.set(where.post, graver(posts.get(where.post), level))
  }
  const bays = new Map(survey.bays.map((bay) => [bay.id, captionOf(bay, ofBays.get(bay.id) ?? null, format)]))
  return { bays, posts }
}

function captionOf(bay: Bay, level: FindingLevel | null, format: LengthFormat): Caption {
  const read = meanOfReadings(bay.readings, 'top') ?? meanOfReadings(bay.readings, 'bottom')
  const length = read ? writeLength(read.mean, format) : '?'
  return { text: bay.kind === 'stair' ? `${length} stair` : length, missing: !read, level }
}
