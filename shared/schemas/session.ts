import { z } from 'zod'
import { companySchema } from './company'
import { personSchema } from './person'

/** Who is signed in, for which company, and the token that requests which change something must carry. */
export const sessionSchema = z.object({
  person: personSchema,
  company: companySchema,
  csrfToken: z.string(),
})
export type Session = z.infer<typeof sessionSchema>
