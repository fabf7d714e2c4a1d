import type { z } from 'zod'
import { type Survey, surveySchema } from '@shared/schemas/survey'
import { inches } from '@shared/units/length'

type SurveyInput = z.input<typeof surveySchema>
type PostInput = NonNullable<SurveyInput['posts']>[number]
type BayInput = NonNullable<SurveyInput['bays']>[number]
type RunInput = NonNullable<SurveyInput['runs']>[number]

/** A survey in inches; whatever is left out is empty. */
export const surveyOf = (more: Partial<SurveyInput> = {}): Survey =>
  surveySchema.parse({
    format: 'tautbook.survey',
    version: 1,
    units: { length: 'in', force: 'lbf' },
    title: 'Back deck',
    ...more,
  })

/** A softwood post, 3 1/2 in square. */
export const aPost = (id: string, more: Partial<PostInput> = {}): PostInput => ({
  id,
  material: 'softwood',
  along: inches(3.5),
  across: inches(3.5),
  ...more,
})

/** A level bay between two posts, read once at the top; no reading where `read` is undefined. */
export const aBay = (
  id: string,
  [from, to]: readonly [string, string],
  { read = 48, ...more }: Partial<BayInput> & { read?: number | null } = {},
): BayInput => ({
  id,
  from,
  to,
  readings: read === null ? [] : [{ id: 'r1', at: 'top', value: inches(read) }],
  ...more,
})

export const aRun = (id: string, bays: string[], more: Partial<RunInput> = {}): RunInput => ({
  id,
  bays,
  cable: 'c532',
  ...more,
})

/** A row of posts P1, P2, … with bays B1, B2, … of these clear lengths in inches between them, and no run. */
export function aRow(clear: readonly number[], more: Partial<SurveyInput> = {}): Survey {
  const posts = Array.from({ length: clear.length + 1 }, (_, i) => aPost(`P${i + 1}`))
  const bays = clear.map((read, i) => aBay(`B${i + 1}`, [`P${i + 1}`, `P${i + 2}`], { read }))
  return surveyOf({ posts, bays, ...more })
}
