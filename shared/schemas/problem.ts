import { z } from 'zod'

/** How the server says no: problem+json (RFC 9457), with a stable code and, for forms, a sentence per field. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  /** Stable, for programs: `survey-moved`. */
  code: z.string(),
  /** One sentence for people: what, where, what to do. */
  detail: z.string(),
  fields: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
})
export type Problem = z.infer<typeof problemSchema>
