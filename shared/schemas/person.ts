import { z } from 'zod'
import { keySchema } from './id'
import { roleSchema } from './role'

export const emailSchema = z.email('Write an e-mail address such as ana@example.com.').max(254).toLowerCase()
/** New passwords: 12 to 64 characters, at most 72 bytes (bcrypt reads no further), any characters. */
export const newPasswordSchema = z
  .string()
  .min(12, 'Use at least 12 characters.')
  .max(64, 'Use at most 64 characters.')
  .refine(
    (text) => new TextEncoder().encode(text).length <= 72,
    'Use at most 72 bytes; accented letters count double.',
  )
export const personNameSchema = z.string().trim().min(1, 'Write the name.').max(120)
export const rolesSchema = z.array(roleSchema).min(1, 'Choose at least one role.').max(5)

export const personSchema = z.object({
  id: keySchema,
  name: z.string(),
  email: z.string(),
  roles: z.array(roleSchema),
  /** `invited`: the one-time link has not been used yet. */
  state: z.enum(['invited', 'active', 'disabled']),
  lastSignIn: z.iso.datetime().nullable(),
})
export type Person = z.infer<typeof personSchema>

/** A one-time link, shown once to the owner who made it. */
export const invitationSchema = z.object({ person: personSchema, link: z.url(), expires: z.iso.datetime() })
